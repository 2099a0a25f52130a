import Svg, { Circle, Path } from 'react-native-svg';
import type { PlanPoint, Vec } from '../../../model/geometry/point';
import { perp, sub, unit } from '../../../model/geometry/vec';
import { thicknessOf } from '../../../model/walls/runs';
import { HIT_REACH } from '../../input/events';
import { drawnType } from '../../tools/toolHost';
import { useTheme } from '../../ui/theme';
import { toScreen, type Camera, type ViewSize } from '../../viewport/camera';
import { useDraft } from '../workspace/workspace';

/** What the tool shows while it works, over the plan: the run being drawn, guides, the point and its halo. */
export function PreviewPicture({ camera, size }: { camera: Camera; size: ViewSize }) {
  const { colours, strokes } = useTheme();
  const preview = useDraft((state) => state.preview);
  const thickness = useDraft((state) => {
    const type = drawnType(state.drawing);
    return type ? thicknessOf(type) : 0;
  });
  if (!preview) return null;
  const place = (at: Vec) => toScreen(camera, size, at);
  const line = (points: readonly Vec[]) => points.map((at, i) => `${i === 0 ? 'M' : 'L'}${spot(place(at))}`).join('');
  const { run, at, guides, outline } = preview;
  const pen = at && place(at);
  return (
    <Svg width={size.width} height={size.height} pointerEvents="none" style={over} aria-hidden>
      {guides.length > 0 ? (
        <Path
          d={guides.map(([from, to]) => line([from, to])).join('')}
          stroke={colours.earthDeep}
          strokeWidth={strokes.thin}
          strokeDasharray="2 6"
          fill="none"
        />
      ) : null}
      {run && run.length > 0 ? (
        <Path
          d={`${line(bodyOf(run.from, run.to, thickness))}Z`}
          fill={colours.earth}
          fillOpacity={0.45}
          stroke={colours.ink}
          strokeWidth={strokes.normal}
          strokeDasharray="7 5"
        />
      ) : null}
      {outline.length > 1 ? (
        <Path
          d={outline.length > 2 ? `${line(outline)}Z` : line(outline)}
          fill={colours.hatch}
          fillOpacity={0.25}
          stroke={colours.frame}
          strokeWidth={strokes.thin}
          strokeDasharray="5 4"
        />
      ) : null}
      {outline[0] && outline.length > 2 ? (
        <Ring at={place(outline[0])} colour={colours.earthDeep} fill={colours.surface} />
      ) : null}
      {run ? <Ring at={place(run.from)} colour={colours.earthDeep} fill={colours.surface} /> : null}
      {pen ? (
        <>
          {preview.pointer === 'touch' ? (
            <Circle cx={pen.x} cy={pen.y} r={HIT_REACH.touch} fill={colours.earthDeep} fillOpacity={0.16} />
          ) : null}
          <Ring at={pen} colour={colours.earthDeep} fill={colours.surface} />
        </>
      ) : null}
    </Svg>
  );
}

function Ring({ at, colour, fill }: { at: Vec; colour: string; fill: string }) {
  return <Circle cx={at.x} cy={at.y} r={7} stroke={colour} strokeWidth={3} fill={fill} />;
}

/** The pale body of a run being drawn, to the left of its line. */
function bodyOf(from: PlanPoint, to: PlanPoint, thickness: number): Vec[] {
  const inward = perp(unit(sub(to, from)));
  const shift = { x: inward.x * thickness, y: inward.y * thickness };
  return [from, to, { x: to.x + shift.x, y: to.y + shift.y }, { x: from.x + shift.x, y: from.y + shift.y }];
}

function spot({ x, y }: Vec): string {
  return `${Math.round(x * 10) / 10} ${Math.round(y * 10) / 10}`;
}

const over = { position: 'absolute', left: 0, top: 0 } as const;
