import { iconPaths, type IconName } from './iconPaths';
import { useTheme } from './theme';

export interface IconProps {
  readonly name: IconName;
  /** Pixels; 24 unless said. */
  readonly size?: number;
  readonly colour?: string;
}

/**
 * One of our icons, as a plain SVG element: the first page would otherwise load a whole SVG package for it.
 * It says nothing aloud: the control around it carries the label.
 */
export function Icon({ name, size = 24, colour }: IconProps) {
  const { colours, strokes } = useTheme();
  return (
    <svg width={size} height={size} viewBox="0 0 24 24" aria-hidden focusable={false} style={{ flexShrink: 0 }}>
      <path
        d={iconPaths[name]}
        fill="none"
        stroke={colour ?? colours.ink}
        strokeWidth={strokes.icon}
        strokeLinecap="square"
        strokeLinejoin="miter"
      />
    </svg>
  );
}
