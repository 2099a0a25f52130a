import { Defs, Line, Pattern } from 'react-native-svg';

/** All figures of a page share one hatch, whichever of them defined it. */
export const HATCH_ID = 'figure-hatch';
const STEP = 7;

/** Hatching at 45°, of a size on the screen whatever the figure's scale. */
export function Hatch({ colour, width }: { readonly colour: string; readonly width: number }) {
  return (
    <Defs>
      <Pattern id={HATCH_ID} patternUnits="userSpaceOnUse" width={STEP} height={STEP} patternTransform="rotate(45)">
        <Line x1={0} y1={0} x2={0} y2={STEP} stroke={colour} strokeWidth={width} />
      </Pattern>
    </Defs>
  );
}
