/** What the tools ask of the model: what lies under a pointer and what a point catches, indexed once for a drawing. */
import { noCutLengths } from '../../model/bond/noCut';
import { placeAt } from '../../model/drawing/edits/runLength';
import type { Drawing, WallType } from '../../model/drawing/schema';
import type { PlanPoint, Vec } from '../../model/geometry/point';
import { distance, sub, unit } from '../../model/geometry/vec';
import { hitTest, indexHits, type HitIndex } from '../../model/hit/hitTest';
import { roundToStep, type Ticks } from '../../model/length/ticks';
import type { PoleSet } from '../../model/poles/types';
import { snapOpening, snapSlide, type AlongSnap, type SlideSnap } from '../../model/snapping/snapAlong';
import { snapSceneOf, type SnapScene } from '../../model/snapping/scene';
import { snapPoint } from '../../model/snapping/snapPoint';
import { SNAP_ALL, type CaughtKind, type GoodLengths } from '../../model/snapping/types';
import { layOutWalls } from '../../model/walls/layOutWalls';
import type { Walls } from '../../model/walls/types';
import { HIT_REACH } from '../input/events';
import type { DraftStore } from '../store/draftStore';
import type { CaughtWord } from '../store/preview';
import type { Caught, CatchOptions, ToolHost } from './tool';

const WORDS: Readonly<Record<CaughtKind, CaughtWord>> = {
  corner: 'corner',
  close: 'close',
  point: 'close',
  onRun: 'run',
  rightAngle: 'square',
  angle15: 'angle',
  alignX: 'inLine',
  alignY: 'inLine',
  module: 'noCut',
};
const ALONG_WORDS: Readonly<Record<AlongSnap['kind'], CaughtWord | null>> = {
  unit: 'units',
  centre: 'middle',
  end: 'end',
  opening: 'opening',
  step: null,
};
const SLIDE_WORDS: Readonly<Record<SlideSnap['kind'], CaughtWord | null>> = {
  module: 'noCut',
  align: 'inLine',
  back: 'back',
  step: null,
};

/** The wall type that the next run is drawn in: its neighbour's. */
export function drawnType(drawing: Drawing): WallType | undefined {
  const last = drawing.runs.at(-1)?.wallTypeId;
  return drawing.wallTypes.find((type) => type.id === last) ?? drawing.wallTypes[0];
}

/** Lengths near one that need no cutting, for a run between two outside corners: what most runs come to be. */
export function goodLengthsOf(type: WallType | undefined): GoodLengths {
  return (near) => {
    if (!type) return [];
    const { below, above } = noCutLengths(type, ['outside', 'outside'], near);
    return [below, above].filter((length) => length !== null);
  };
}

interface Scene {
  readonly drawing: Drawing;
  readonly walls: Walls;
  readonly snap: SnapScene;
  readonly goodLengths: GoodLengths;
}

export interface ToolHostOf {
  readonly draft: DraftStore;
  /** Poles of the last set-out, to be hit as well; null where there are none. */
  poles(): PoleSet | null;
  /** Pixels per tick. */
  scale(): number;
  newId(): string;
}

export function createToolHost({ draft, poles, scale, newId }: ToolHostOf): ToolHost {
  let scene: Scene | null = null;
  let hits: { readonly drawing: Drawing; readonly poles: PoleSet | null; readonly index: HitIndex } | null = null;

  /** While a gesture changes the drawing, what it can catch stays what was there when it began. */
  function sceneNow(): Scene {
    const { drawing, gesture } = draft.get();
    if (scene && (gesture !== null || scene.drawing === drawing)) return scene;
    const walls = layOutWalls(drawing);
    scene = { drawing, walls, snap: snapSceneOf(drawing, walls), goodLengths: goodLengthsOf(drawnType(drawing)) };
    return scene;
  }

  function hitsNow(): HitIndex {
    const { drawing, walls } = sceneNow();
    const standing = poles();
    if (hits?.drawing !== drawing || hits.poles !== standing)
      hits = { drawing, poles: standing, index: indexHits(drawing, walls, standing) };
    return hits.index;
  }

  function catchPoint(at: Vec, options: CatchOptions): Caught {
    const { snap: snapScene, drawing, goodLengths } = sceneNow();
    const snap = snapPoint({
      scene: snapScene,
      raw: at,
      reach: options.reach,
      from: options.from,
      also: options.also,
      options: options.snapping ? SNAP_ALL : { ...SNAP_ALL, on: false },
      exclude: options.without,
      closes: options.closes,
      points: options.points,
      goodLengths,
    });
    const [first] = snap.caught;
    if (!first) return { at: onTape(at, options.from?.point ?? null, drawing.tapeStep), ...NOTHING };
    const corner = first.kind === 'corner' || first.kind === 'close' ? (first.thing?.id ?? null) : null;
    const run = snap.caught.find((one) => one.kind === 'onRun');
    const onRun = run?.thing && run.at !== undefined ? { runId: run.thing.id, at: run.at } : null;
    const guides = snap.caught.flatMap((one) => (one.guide ? [one.guide] : []));
    return { at: snap.point, cornerId: corner, onRun, guides, word: WORDS[first.kind] };
  }

  return {
    draft,
    reach: (pointer) => HIT_REACH[pointer] / scale(),
    hit: (at, reach) => hitTest(hitsNow(), at, reach),
    catchPoint,
    catchOpening({ snapping, reach, ...of }) {
      const { drawing, walls } = sceneNow();
      const { at, kind } = snapOpening({ drawing, walls, ...of, reach: snapping ? reach : 0 });
      return { at, word: snapping ? ALONG_WORDS[kind] : null };
    },
    catchSlide({ runId, raw, reach, snapping }) {
      const { drawing, walls, goodLengths } = sceneNow();
      if (!snapping) return { at: roundToStep(raw, drawing.tapeStep), word: null };
      const { by, kind } = snapSlide({ drawing, walls, runId, raw, reach, goodLengths });
      return { at: by, word: SLIDE_WORDS[kind] };
    },
    newId,
  };
}

const NOTHING = { cornerId: null, onRun: null, guides: [], word: null } as const;

/** A free point falls on the tape: by its distance from where the run starts, or by its place where nothing holds it. */
function onTape(at: Vec, from: PlanPoint | null, step: Ticks): PlanPoint {
  if (!from) return { x: roundToStep(at.x, step), y: roundToStep(at.y, step) };
  const length = roundToStep(distance(from, at), step);
  return length === 0 ? from : placeAt(from, unit(sub(at, from)), length);
}
