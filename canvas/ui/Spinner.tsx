import { useTheme } from './theme';

/** A turning arc: something is under way. It says nothing aloud; what it stands in does. */
export function Spinner({ size = 28, colour }: { size?: number; colour?: string }) {
  const { colours, strokes } = useTheme();
  return (
    <svg width={size} height={size} viewBox="0 0 24 24" aria-hidden className="turning" style={{ flexShrink: 0 }}>
      <path
        d="M12 3a9 9 0 1 1-9 9"
        fill="none"
        stroke={colour ?? colours.earthDeep}
        strokeWidth={strokes.icon}
        strokeLinecap="square"
      />
    </svg>
  );
}
