/** Control heights and bond beams. */
import { newBondBeam, newControlHeight } from '../defaults';
import { bondBeamSchema, controlHeightSchema, type BondBeam, type ControlHeight, type Drawing } from '../schema';
import { replaceById, type NewId } from './find';

const MOST_HEIGHTS = 40;
const MOST_BEAMS = 10;

/** Adds a height to meet, with the usual values of its kind and what the caller says. */
export function addControlHeight(
  drawing: Drawing,
  height: { readonly kind: ControlHeight['kind'] } & Partial<Omit<ControlHeight, 'id' | 'kind'>>,
  newId: NewId,
): Drawing {
  if (drawing.controlHeights.length >= MOST_HEIGHTS) return drawing;
  const added = { ...newControlHeight(drawing.units, height.kind, newId()), ...height };
  return controlHeightSchema.safeParse(added).success
    ? { ...drawing, controlHeights: [...drawing.controlHeights, added] }
    : drawing;
}

export function changeControlHeight(drawing: Drawing, id: string, change: Partial<Omit<ControlHeight, 'id'>>): Drawing {
  const controlHeights = replaceById(drawing.controlHeights, id, (height) => {
    const next = { ...height, ...change };
    return controlHeightSchema.safeParse(next).success ? next : height;
  });
  return controlHeights === drawing.controlHeights ? drawing : { ...drawing, controlHeights };
}

export function deleteControlHeight(drawing: Drawing, id: string): Drawing {
  return drawing.controlHeights.some((height) => height.id === id)
    ? { ...drawing, controlHeights: drawing.controlHeights.filter((height) => height.id !== id) }
    : drawing;
}

/** Adds a bond beam with usual values and what the caller says. */
export function addBondBeam(drawing: Drawing, beam: Partial<Omit<BondBeam, 'id'>>, newId: NewId): Drawing {
  if (drawing.bondBeams.length >= MOST_BEAMS) return drawing;
  const added = { ...newBondBeam(drawing.units, newId()), ...beam };
  return bondBeamSchema.safeParse(added).success ? { ...drawing, bondBeams: [...drawing.bondBeams, added] } : drawing;
}

export function changeBondBeam(drawing: Drawing, id: string, change: Partial<Omit<BondBeam, 'id'>>): Drawing {
  const bondBeams = replaceById(drawing.bondBeams, id, (beam) => {
    const next = { ...beam, ...change };
    return bondBeamSchema.safeParse(next).success ? next : beam;
  });
  return bondBeams === drawing.bondBeams ? drawing : { ...drawing, bondBeams };
}

export function deleteBondBeam(drawing: Drawing, id: string): Drawing {
  return drawing.bondBeams.some((beam) => beam.id === id)
    ? { ...drawing, bondBeams: drawing.bondBeams.filter((beam) => beam.id !== id) }
    : drawing;
}
