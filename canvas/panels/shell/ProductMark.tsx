import { useTheme } from '../../ui/theme';

/** Our mark: a pole, a wall and the line at the next course. */
export function ProductMark({ size = 32 }: { size?: number }) {
  const { colours } = useTheme();
  return (
    <svg width={size} height={size} viewBox="8 6 52 52" aria-hidden>
      <path
        d="M27 42h30v12H27zM27 30h17v12H27zM44 30h13v12H44z"
        fill={colours.earth}
        stroke={colours.ink}
        strokeWidth={2.5}
      />
      <path d="M16 8h7v46h-7z" fill={colours.steel} />
      <path d="M11 54h13M11 42h13M11 18h13" stroke={colours.line} strokeWidth={2.5} />
      <path d="M10 30h49" stroke={colours.line} strokeWidth={4} />
    </svg>
  );
}
