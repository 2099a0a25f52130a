/** Reads what a PDF draws, by itself: objects, pages and content streams, inflated where they are compressed. */
import { inflateSync } from 'node:zlib';

export interface PdfPage {
  /** Points. */
  readonly width: number;
  readonly height: number;
  readonly content: string;
}

export interface Pdf {
  readonly pages: readonly PdfPage[];
  /** `/BaseFont` of every font. */
  readonly fonts: readonly string[];
  /** How many font files are embedded. */
  readonly embedded: number;
}

/** Everything a readable stream gives, in one piece. */
export async function readAll(stream: NodeJS.ReadableStream): Promise<Buffer> {
  const chunks: Buffer[] = [];
  for await (const chunk of stream) chunks.push(Buffer.from(chunk as Uint8Array));
  return Buffer.concat(chunks);
}

function objectsOf(file: Buffer): Map<number, { head: string; stream: Buffer | null }> {
  const text = file.toString('latin1');
  const objects = new Map<number, { head: string; stream: Buffer | null }>();
  for (const match of text.matchAll(/(\d+) 0 obj\n([\s\S]*?)\nendobj/g)) {
    const body = match[2] ?? '';
    const at = body.indexOf('\nstream\n');
    const head = at < 0 ? body : body.slice(0, at);
    const length = Number(head.match(/\/Length (\d+)/)?.[1] ?? 0);
    const start = (match.index ?? 0) + match[0].indexOf(body) + at + '\nstream\n'.length;
    objects.set(Number(match[1]), { head, stream: at < 0 ? null : file.subarray(start, start + length) });
  }
  return objects;
}

export function readPdf(file: Buffer): Pdf {
  const objects = objectsOf(file);
  const heads = [...objects.values()].map((object) => object.head);
  const pages = heads
    .filter((head) => /\/Type \/Page\b(?!s)/.test(head))
    .map((head) => {
      const box = head.match(/\/MediaBox \[0 0 ([\d.]+) ([\d.]+)\]/);
      const content = objects.get(Number(head.match(/\/Contents (\d+) 0 R/)?.[1]));
      const bytes = content?.stream ?? Buffer.alloc(0);
      const plain = content?.head.includes('/FlateDecode') ? inflateSync(bytes) : bytes;
      return { width: Number(box?.[1]), height: Number(box?.[2]), content: plain.toString('latin1') };
    });
  return {
    pages,
    fonts: [...new Set(heads.flatMap((head) => head.match(/\/BaseFont \/([^\s/]+)/)?.[1] ?? []))],
    embedded: heads.filter((head) => head.includes('/FontFile2')).length,
  };
}

export interface Stroke {
  readonly points: readonly { readonly x: number; readonly y: number }[];
  /** `rg` or `RG` triple in force for the line, as written. */
  readonly colour: string;
  readonly width: number;
}

/** Straight strokes of a page in points from its top left, by following `cm`, `q`, `Q`, `m`, `l`, `re` and painting. */
export function strokesOf(page: PdfPage): Stroke[] {
  type Matrix = [number, number, number, number, number, number];
  const multiply = (m: Matrix, n: Matrix): Matrix => [
    m[0] * n[0] + m[1] * n[2],
    m[0] * n[1] + m[1] * n[3],
    m[2] * n[0] + m[3] * n[2],
    m[2] * n[1] + m[3] * n[3],
    m[4] * n[0] + m[5] * n[2] + n[4],
    m[4] * n[1] + m[5] * n[3] + n[5],
  ];
  let state = { matrix: [1, 0, 0, 1, 0, 0] as Matrix, colour: '', width: 1 };
  const saved: (typeof state)[] = [];
  let path: { x: number; y: number }[][] = [];
  const strokes: Stroke[] = [];
  const place = (x: number, y: number) => {
    const [a, b, c, d, e, f] = state.matrix;
    return { x: a * x + c * y + e, y: page.height - (b * x + d * y + f) };
  };
  for (const line of page.content.split('\n')) {
    const words = line.trim().split(/\s+/);
    const operator = words.pop();
    const n = words.map(Number);
    const at = (i: number) => n[i] ?? NaN;
    if (operator === 'q') saved.push({ ...state });
    else if (operator === 'Q') state = saved.pop() ?? state;
    else if (operator === 'cm') state.matrix = multiply(n as unknown as Matrix, state.matrix);
    else if (operator === 'SCN' || operator === 'RG') state.colour = words.join(' ');
    else if (operator === 'w') state.width = at(0);
    else if (operator === 'm') path.push([place(at(0), at(1))]);
    else if (operator === 'l') path[path.length - 1]?.push(place(at(0), at(1)));
    else if (operator === 're')
      path.push([
        place(at(0), at(1)),
        place(at(0) + at(2), at(1)),
        place(at(0) + at(2), at(1) + at(3)),
        place(at(0), at(1) + at(3)),
      ]);
    else if (operator === 'S' || operator === 'B') {
      for (const points of path) strokes.push({ points, colour: state.colour, width: state.width });
      path = [];
    } else if (operator === 'f' || operator === 'n') path = [];
  }
  return strokes;
}
