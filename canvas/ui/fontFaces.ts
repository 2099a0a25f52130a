import barlow400 from '../../fonts/Barlow-400Regular.ttf';
import barlow500 from '../../fonts/Barlow-500Medium.ttf';
import barlow600 from '../../fonts/Barlow-600SemiBold.ttf';
import condensed400 from '../../fonts/BarlowCondensed-400Regular.ttf';
import condensed500 from '../../fonts/BarlowCondensed-500Medium.ttf';
import condensed600 from '../../fonts/BarlowCondensed-600SemiBold.ttf';

const faces = [
  { family: 'Barlow', weight: 400, address: barlow400 },
  { family: 'Barlow', weight: 500, address: barlow500 },
  { family: 'Barlow', weight: 600, address: barlow600 },
  { family: 'Barlow Condensed', weight: 400, address: condensed400 },
  { family: 'Barlow Condensed', weight: 500, address: condensed500 },
  { family: 'Barlow Condensed', weight: 600, address: condensed600 },
] as const;

const MARK = 'polewright-fonts';

/**
 * Declares the typefaces to the browser and starts to fetch them, so that they are mostly there before the first words.
 * Until then a stand-in of about their width is shown, so that little moves when they arrive.
 */
export function installFonts(): void {
  if (typeof document === 'undefined' || document.getElementById(MARK)) return;
  const style = document.createElement('style');
  style.id = MARK;
  const own = faces.map(
    ({ family, weight, address }) =>
      `@font-face{font-family:"${family}";font-weight:${weight};font-display:swap;src:url("${address}") format("truetype")}`,
  );
  const standIns = [
    '@font-face{font-family:"Barlow stand-in";size-adjust:95%;src:local("Arial"),local("Liberation Sans"),local("Roboto")}',
    '@font-face{font-family:"Barlow Condensed stand-in";size-adjust:74%;src:local("Arial"),local("Liberation Sans"),local("Roboto")}',
  ];
  style.textContent = [...own, ...standIns].join('\n');
  document.head.appendChild(style);
  for (const { family, weight } of faces) void document.fonts?.load(`${weight} 16px "${family}"`);
}
