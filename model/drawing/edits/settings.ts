/** What holds for the whole drawing: wall types, pole kit, units and tape, and rules that the site has changed. */
import type { Ticks } from '../../length/ticks';
import type { RuleId } from '../../rules/ids';
import { defaultTapeStep } from '../defaults';
import { drawingSchema, poleKitSchema, wallTypeSchema } from '../schema';
import type { Drawing, PoleKit, Units, WallType } from '../schema';
import { findRun, replaceById, type NewId } from './find';

const MOST_TYPES = 8;

/** Adds a wall type like the drawing's first, with what the caller says. */
export function addWallType(drawing: Drawing, type: Partial<Omit<WallType, 'id'>>, newId: NewId): Drawing {
  const [first] = drawing.wallTypes;
  if (!first || drawing.wallTypes.length >= MOST_TYPES) return drawing;
  const added = { ...first, ...type, id: newId() };
  return wallTypeSchema.safeParse(added).success ? { ...drawing, wallTypes: [...drawing.wallTypes, added] } : drawing;
}

export function changeWallType(drawing: Drawing, id: string, change: Partial<Omit<WallType, 'id'>>): Drawing {
  const wallTypes = replaceById(drawing.wallTypes, id, (type) => {
    const next = { ...type, ...change };
    return wallTypeSchema.safeParse(next).success ? next : type;
  });
  return wallTypes === drawing.wallTypes ? drawing : { ...drawing, wallTypes };
}

/** Deletes a wall type that no run uses; the last one stays. */
export function deleteWallType(drawing: Drawing, id: string): Drawing {
  const rest = drawing.wallTypes.filter((type) => type.id !== id);
  if (rest.length === drawing.wallTypes.length || rest.length === 0) return drawing;
  return drawing.runs.some((run) => run.wallTypeId === id) ? drawing : { ...drawing, wallTypes: rest };
}

/** Gives a run another wall type. */
export function setRunWallType(drawing: Drawing, runId: string, wallTypeId: string): Drawing {
  const known = drawing.wallTypes.some((type) => type.id === wallTypeId);
  const run = findRun(drawing, runId);
  if (!known || !run || run.wallTypeId === wallTypeId) return drawing;
  return { ...drawing, runs: replaceById(drawing.runs, runId, (one) => ({ ...one, wallTypeId })) };
}

export function changePoleKit(drawing: Drawing, change: Partial<PoleKit>): Drawing {
  const poleKit = { ...drawing.poleKit, ...change };
  return poleKitSchema.safeParse(poleKit).success ? { ...drawing, poleKit } : drawing;
}

/** Changes the units that lengths are shown and typed in, with their usual tape; nothing is resized. */
export function setUnits(drawing: Drawing, units: Units): Drawing {
  return drawing.units === units ? drawing : { ...drawing, units, tapeStep: defaultTapeStep(units) };
}

export function setTapeStep(drawing: Drawing, tapeStep: Ticks): Drawing {
  if (drawing.tapeStep === tapeStep) return drawing;
  return drawingSchema.shape.tapeStep.safeParse(tapeStep).success ? { ...drawing, tapeStep } : drawing;
}

/** Sets the site's own value for a rule, or goes back to the registry's with null. */
export function setRuleValue(drawing: Drawing, rule: RuleId, value: number | null): Drawing {
  if (drawing.ruleValues[rule] === (value ?? undefined)) return drawing;
  const ruleValues = { ...drawing.ruleValues };
  if (value === null) delete ruleValues[rule];
  else ruleValues[rule] = value;
  return drawingSchema.shape.ruleValues.safeParse(ruleValues).success ? { ...drawing, ruleValues } : drawing;
}
