import { useId } from 'react';
import { View } from 'react-native';
import type { PlanPoint } from '../../../model/geometry/point';
import { radius } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { outlinePath } from './outlinePath';

/** A site's walls the size of a thumb. Decoration: the words beside it say what matters. */
export function OutlinePicture({ outline, size }: { outline: readonly (readonly PlanPoint[])[]; size: number }) {
  const { colours } = useTheme();
  const inside = useId();
  const path = outlinePath(outline, size);
  const edge = Math.max(1.5, size / 52);
  const wall = size / 14;
  return (
    <View style={{ width: size, height: size, backgroundColor: colours.ground, borderRadius: radius }}>
      <svg width={size} height={size} viewBox={`0 0 ${size} ${size}`} aria-hidden>
        {path === null ? (
          <path
            d={`M${size * 0.2} ${size * 0.3}h${size * 0.6}v${size * 0.4}h${-size * 0.6}z`}
            fill="none"
            stroke={colours.edge}
            strokeWidth={edge}
            strokeDasharray={`${size / 16} ${size / 16}`}
          />
        ) : (
          <>
            <clipPath id={inside}>
              <path d={path} />
            </clipPath>
            <g fill="none" strokeLinejoin="miter">
              <path d={path} clipPath={`url(#${inside})`} stroke={colours.ink} strokeWidth={2 * (wall + edge)} />
              <path d={path} clipPath={`url(#${inside})`} stroke={colours.earth} strokeWidth={2 * wall} />
              <path d={path} stroke={colours.ink} strokeWidth={edge} />
            </g>
          </>
        )}
      </svg>
    </View>
  );
}
