import { useCallback } from 'react';
import type { Drawing } from '../../../model/drawing/schema';
import { elevationFigure } from '../../../model/figures/elevation';
import { hitElevation } from '../../../model/figures/elevationHit';
import type { Figure, LabelScale } from '../../../model/figures/figure';
import type { SetOut } from '../../../model/setOut';
import { FigureFrame } from '../../figures/FigureFrame';
import { useWords } from '../../ui/words';

export interface ElevationViewProps {
  readonly drawing: Drawing;
  readonly setOut: SetOut;
  readonly runId: string;
  readonly selectedCourse: number | null;
  readonly poleId?: string | null;
  readonly onPickCourse?: (course: number) => void;
  readonly onPickPole?: (poleId: string) => void;
}

function emptyFigure(drawing: Drawing): Figure {
  const zero = 0 as Figure['bounds']['left'];
  const bounds = { left: zero, bottom: zero, right: zero, top: zero };
  return { name: 'elevation', bounds, tape: { units: drawing.units, step: drawing.tapeStep }, shapes: [] };
}

/** A wall run from outside: tap a course to string the line there, a pole to open it. */
export function ElevationView(props: ElevationViewProps) {
  const { drawing, setOut, runId, selectedCourse, poleId = null, onPickCourse, onPickPole } = props;
  const t = useWords();
  const make = useCallback(
    (scale: LabelScale) =>
      elevationFigure(drawing, setOut, runId, { scale, selectedCourse, poleId }) ?? emptyFigure(drawing),
    [drawing, setOut, runId, selectedCourse, poleId],
  );
  const run = setOut.walls.runById.get(runId);
  const label = t('walls.elevationLabel', {
    name: run?.name ?? '',
    courses: setOut.coursing.courses.length,
    openings: setOut.walls.openingsByRun.get(runId)?.length ?? 0,
  });
  return (
    <FigureFrame
      make={make}
      of={runId}
      label={label}
      onTap={(at, reach) => {
        const hit = hitElevation(setOut, runId, at, reach);
        if (hit?.kind === 'pole') onPickPole?.(hit.poleId);
        if (hit?.kind === 'course') onPickCourse?.(hit.number);
      }}
    />
  );
}
