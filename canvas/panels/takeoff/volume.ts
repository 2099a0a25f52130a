/** Volumes in words: cubic feet where the site works in inches, cubic metres where it works in millimetres. */
import type { Units } from '../../../model/drawing/schema';
import type { Words } from '../../ui/words';

/** 304.8³: the foot is exactly 304.8 mm (NIST SP 811, B.8). */
const CUBIC_MM_PER_CUBIC_FOOT = 304.8 ** 3;

/** A volume of cubic millimetres, rounded up to a tenth of a cubic foot or a hundredth of a cubic metre. */
export function wordVolume(cubicMillimetres: number, units: Units, t: Words): string {
  if (units === 'imperial')
    return t('takeoff.cubicFeet', {
      volume: (Math.ceil((cubicMillimetres / CUBIC_MM_PER_CUBIC_FOOT) * 10 - 1e-6) / 10).toFixed(1),
    });
  return t('takeoff.cubicMetres', { volume: (Math.ceil(cubicMillimetres / 1e7 - 1e-6) / 100).toFixed(2) });
}
