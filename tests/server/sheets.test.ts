import { beforeAll, describe, expect, it } from 'vitest';
import { EMPTY_SURVEY } from '../../model/drawing/surveySchema';
import { solve } from '../../model/setOut';
import { printSheets, type SheetsInput } from '../../server/sheets/printSheets';
import { standardScales } from '../../server/sheets/paper';
import { dayOf } from '../../server/sheets/sheet';
import { readingsAt, rowOfRooms, slantedStudio, toolStore } from '../model/figures/scenes';
import { readAll, readPdf, strokesOf, type Pdf, type Stroke } from '../helpers/pdf';

const revision = {
  number: 3,
  note: 'Door moved toward B',
  savedBy: 'Robin Sample',
  savedAt: '2026-11-12T09:30:00.000Z',
};
const store = toolStore();
const storeInput: SheetsInput = {
  siteName: 'Cedar Bend tool store',
  revision,
  drawing: store,
  survey: readingsAt(store, [5, 3, 0, 1, 2, 4]),
};

/** What the sheets say, as keys: the words themselves are drawn as glyphs of an embedded font. */
async function print(input: SheetsInput, compress = false): Promise<{ pdf: Pdf; said: string[]; bytes: Buffer }> {
  const said: string[] = [];
  const say = (key: string, params?: Readonly<Record<string, string | number>>) => {
    said.push(`${key} ${JSON.stringify(params ?? {})}`);
    return key;
  };
  const bytes = await readAll(printSheets(input, { compress, say }));
  return { pdf: readPdf(bytes), said, bytes };
}

const MM_PER_POINT = 25.4 / 72;
const lengthOf = ({ points }: Stroke) => {
  const [a, b] = [points[0], points[points.length - 1]];
  return a && b ? Math.hypot(b.x - a.x, b.y - a.y) * MM_PER_POINT : NaN;
};
/** Walls' faces are printed 1.1 points wide, as nothing else of the plan is. */
const facesOf = (strokes: readonly Stroke[]) => strokes.filter((stroke) => Math.abs(stroke.width - 1.1) < 1e-6);

let printed: Awaited<ReturnType<typeof print>>;
beforeAll(async () => {
  printed = await print(storeInput);
});

describe('the sheets of the tool store', () => {
  it('are one plan, the six walls, and a card for each pole and lift', () => {
    const setOut = solve(store, storeInput.survey);
    const cards = printed.said.filter((line) => line.startsWith('sheets.documentTypes.pole')).length;
    const plans = printed.said.filter((line) => line.startsWith('sheets.documentTypes.plan')).length;
    const elevations = printed.said.filter((line) => line.startsWith('sheets.documentTypes.elevation')).length;
    expect(cards).toBe(setOut.marks.poles.length);
    expect(plans).toBe(1);
    expect(printed.pdf.pages).toHaveLength(cards + plans + elevations);
    const walls = printed.said
      .filter((line) => line.startsWith('sheets.elevation '))
      .map((line) => line.match(/"name":"(.*?)"/)?.[1]);
    expect(walls).toEqual(['A–B', 'B–C', 'C–D', 'D–E', 'E–F', 'F–A']);
  });

  it('are letter size, the drawings lying and the cards upright', () => {
    const sizes = printed.pdf.pages.map(({ width, height }) => `${width} × ${height}`);
    expect(sizes[0]).toBe('792 × 612');
    expect(sizes[sizes.length - 1]).toBe('612 × 792');
  });

  it('draw the walls true to the scale that is written, to a tenth of a millimetre', () => {
    const scale = Number(printed.said.find((line) => line.startsWith('sheets.scale'))?.match(/1:(\d+)/)?.[1]);
    expect([48, 64, 96]).toContain(scale);
    const page = printed.pdf.pages[0];
    if (!page) throw new Error('no plan');
    const faces = facesOf(strokesOf(page)).map(lengthOf);
    // D–E has no opening: its outside face is 6 ft = 1828.8 mm, its inside one too, in the corner of D and round E's.
    const whole = 1828.8 / scale;
    expect(faces.some((length) => Math.abs(length - whole) < 0.1)).toBe(true);
    // A–B to its door at 18 in = 457.2 mm, and from the door's far jamb (57 in) to the window at 13 ft: 99 in = 2514.6 mm.
    expect(faces.some((length) => Math.abs(length - 457.2 / scale) < 0.1)).toBe(true);
    expect(faces.some((length) => Math.abs(length - 2514.6 / scale) < 0.1)).toBe(true);
    // The same check fails for a length that is nowhere: it can tell a tenth of a millimetre.
    expect(faces.some((length) => Math.abs(length - 1234.5 / scale) < 0.1)).toBe(false);
  });

  it('keep everything on the sheet', () => {
    for (const page of printed.pdf.pages)
      for (const { points } of strokesOf(page))
        for (const { x, y } of points) {
          expect(x).toBeGreaterThan(18);
          expect(x).toBeLessThan(page.width - 18);
          expect(y).toBeGreaterThan(18);
          expect(y).toBeLessThan(page.height - 18);
        }
  });

  it('carry their own Barlow and no font of the reader’s', () => {
    expect(printed.pdf.fonts.length).toBeGreaterThanOrEqual(4);
    for (const font of printed.pdf.fonts) expect(font).toMatch(/^[A-Z]{6}\+Barlow/);
    expect(printed.pdf.embedded).toBeGreaterThanOrEqual(4);
  });

  it('have the cautions and every field of the title block on each', () => {
    const count = printed.pdf.pages.length;
    for (const key of ['cautions.code', 'cautions.work'])
      expect(printed.said.filter((line) => line.startsWith(`sheets.${key} `))).toHaveLength(count);
    // ISO 7200:2004 (secondary): legal owner, identification number, date of issue, sheet, title, approval, creator, document type.
    for (const field of ['owner', 'identification', 'issued', 'sheet', 'title', 'approval', 'creator', 'documentType'])
      expect(printed.said.filter((line) => line.startsWith(`sheets.fields.${field} `))).toHaveLength(count);
    expect(printed.said).toContain(`sheets.sheetOf ${JSON.stringify({ number: count, total: count })}`);
  });

  it('print the same bytes for the same input', async () => {
    expect((await print(storeInput)).bytes.equals(printed.bytes)).toBe(true);
  });

  it('hold the same drawing when compressed, in fewer bytes', async () => {
    const small = await print(storeInput, true);
    expect(small.pdf.pages.map((page) => page.content)).toEqual(printed.pdf.pages.map((page) => page.content));
    expect(small.bytes.length).toBeLessThan(printed.bytes.length * 0.8);
  });
});

describe('other sheets', () => {
  it('say draft on every sheet of a draft', async () => {
    const { said, pdf } = await print({ ...storeInput, revision: null });
    // Once across the drawing and once in the heading of each sheet, and once in the file's title.
    expect(said.filter((line) => line.startsWith('sheets.draft '))).toHaveLength(2 * pdf.pages.length + 1);
    expect(said.some((line) => line.startsWith('sheets.revision '))).toBe(false);
  });

  it('are A4 at a metric scale where the site works in millimetres', async () => {
    const drawing = slantedStudio();
    const { said, pdf } = await print({ ...storeInput, drawing, survey: EMPTY_SURVEY });
    // A4 by ISO 216: 210 × 297 mm.
    expect(pdf.pages[0]?.width).toBeCloseTo((297 * 72) / 25.4, 1);
    expect(pdf.pages[0]?.height).toBeCloseTo((210 * 72) / 25.4, 1);
    const scale = Number(said.find((line) => line.startsWith('sheets.scale'))?.match(/"1:(\d+)"/)?.[1]);
    expect([20, 50, 100]).toContain(scale);
    const page = pdf.pages[0];
    // B–C runs from (6000, 1500) to (4500, 6200) without an opening.
    const length = Math.hypot(1500, 4700) / scale;
    expect(page && facesOf(strokesOf(page)).some((stroke) => Math.abs(lengthOf(stroke) - length) < 0.1)).toBe(true);
  });

  it('take a larger paper for the drawings and leave the cards as they are', async () => {
    const { pdf } = await print({ ...storeInput, paper: 'tabloid' });
    expect(pdf.pages[0]).toMatchObject({ width: 1224, height: 792 });
    expect(pdf.pages[pdf.pages.length - 1]).toMatchObject({ width: 612, height: 792 });
  });

  it('print an empty drawing as one plan without anything on it', async () => {
    const empty = { ...store, corners: [], runs: [], openings: [] };
    const { pdf } = await print({ ...storeInput, drawing: empty, survey: EMPTY_SURVEY });
    expect(pdf.pages).toHaveLength(1);
  });

  it('go to a smaller scale for a longer building', async () => {
    const scaleOf = async (rooms: number) => {
      const { said } = await print({ ...storeInput, drawing: rowOfRooms(rooms), survey: EMPTY_SURVEY });
      return Number(said.find((line) => line.startsWith('sheets.scale'))?.match(/1:(\d+)/)?.[1]);
    };
    expect(await scaleOf(2)).toBeGreaterThan(await scaleOf(1));
  });
});

describe('standard scales', () => {
  it('are those of drafting practice, by inches to the foot and by ISO 5455', () => {
    const scales = standardScales('imperial');
    // 1/8 in = 1 ft is 1:96 and so on: general drafting practice.
    for (const [text, n] of [
      ['1/8 in', 96],
      ['1/4 in', 48],
      ['1/2 in', 24],
      ['3/4 in', 16],
      ['3 in', 4],
    ] as const) {
      const scale = scales.find((each) => each.denominator === n);
      expect(scale?.text).toBe(`${text} = 1 ft (1:${n})`);
      // A foot of the building in points of paper: 12 × 72 / n.
      expect((scale?.pointsPerTick ?? 0) * 12 * 16_256).toBeCloseTo(864 / n, 9);
    }
    // ISO 5455 (from memory).
    expect(
      standardScales('metric')
        .slice(0, 5)
        .map((each) => each.denominator),
    ).toEqual([5, 10, 20, 50, 100]);
  });
});

describe('the day of issue', () => {
  it('is said in full, in UTC', () => {
    expect(dayOf('2026-11-12T23:30:00.000Z')).toBe('12 November 2026');
    expect(dayOf('2026-11-13T01:00:00+02:00')).toBe('12 November 2026');
  });
});
