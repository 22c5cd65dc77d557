import { getDocument, OPS, type PDFPageProxy } from 'pdfjs-dist/legacy/build/pdf.mjs';

/** Millimetres from the top left corner of the page. */
export interface ReadPoint {
  x: number;
  y: number;
}

export interface ReadBox {
  left: number;
  right: number;
  top: number;
  bottom: number;
}

/** One path as the paper shows it. */
export interface ReadPath {
  isStroked: boolean;
  lineWidthMm: number;
  isDashed: boolean;
  isCurved: boolean;
  /** Ends of its pieces; what bends a curve between them is left out. */
  points: ReadPoint[];
  box: ReadBox;
}

export interface ReadText {
  text: string;
  sizeMm: number;
  isUpright: boolean;
  /** From the base line up to the capitals' height, and as wide as the words. */
  box: ReadBox;
}

export interface ReadPage {
  widthMm: number;
  heightMm: number;
  paths: ReadPath[];
  texts: ReadText[];
}

export interface ReadSheet {
  /** The file itself, one character a byte. */
  raw: string;
  title: string;
  pages: ReadPage[];
}

const MM_PER_POINT = 25.4 / 72;

type Matrix = [number, number, number, number, number, number];

interface GraphicsState {
  matrix: Matrix;
  lineWidth: number;
  isDashed: boolean;
}

const times = (m: Matrix, n: Matrix): Matrix => [
  m[0] * n[0] + m[2] * n[1],
  m[1] * n[0] + m[3] * n[1],
  m[0] * n[2] + m[2] * n[3],
  m[1] * n[2] + m[3] * n[3],
  m[0] * n[4] + m[2] * n[5] + m[4],
  m[1] * n[4] + m[3] * n[5] + m[5],
];

/** Reads a sheet back with a PDF reader that had no part in drawing it. */
export async function readSheet(pdf: NodeJS.ReadableStream): Promise<ReadSheet> {
  const chunks: Buffer[] = [];
  for await (const chunk of pdf) chunks.push(Buffer.from(chunk as Buffer));
  const bytes = Buffer.concat(chunks);
  const task = getDocument({ data: new Uint8Array(bytes), verbosity: 0 });
  const document = await task.promise;
  const { info } = (await document.getMetadata()) as { info: { Title?: string } };
  const pages: ReadPage[] = [];
  for (let number = 1; number <= document.numPages; number += 1) {
    pages.push(await readPage(await document.getPage(number)));
  }
  await task.destroy();
  return { raw: bytes.toString('latin1'), title: info.Title ?? '', pages };
}

async function readPage(page: PDFPageProxy): Promise<ReadPage> {
  const [, , width = 0, height = 0] = page.view;
  const heightMm = height * MM_PER_POINT;
  const { fnArray, argsArray } = await page.getOperatorList();
  const content = await page.getTextContent();
  const texts = content.items.flatMap((item) =>
    'str' in item && item.str.trim() !== ''
      ? [readText({ ...item, transform: item.transform as number[] }, heightMm)]
      : [],
  );
  return {
    widthMm: width * MM_PER_POINT,
    heightMm,
    paths: readPaths(fnArray, argsArray as unknown[], heightMm),
    texts,
  };
}

function readPaths(fnArray: readonly number[], argsArray: readonly unknown[], heightMm: number): ReadPath[] {
  const stack: GraphicsState[] = [];
  let state: GraphicsState = { matrix: [1, 0, 0, 1, 0, 0], lineWidth: 1, isDashed: false };
  const paths: ReadPath[] = [];
  fnArray.forEach((fn, index) => {
    const args = argsArray[index] as unknown[];
    if (fn === OPS.save) stack.push(state);
    else if (fn === OPS.restore) state = stack.pop() ?? state;
    else if (fn === OPS.transform) state = { ...state, matrix: times(state.matrix, args as Matrix) };
    else if (fn === OPS.setLineWidth) state = { ...state, lineWidth: args[0] as number };
    else if (fn === OPS.setDash) state = { ...state, isDashed: (args[0] as number[]).length > 0 };
    else if (fn === OPS.constructPath) paths.push(readPath(args, state, heightMm));
  });
  return paths;
}

/** Numbers of a path: 0 move, 1 line, 2 curve, 3 quadratic curve, 4 close, each with its points. */
const POINTS_OF_STEP = [1, 1, 3, 2, 0] as const;

function readPath(args: unknown[], state: GraphicsState, heightMm: number): ReadPath {
  const [paint, [data]] = args as [number, [Float32Array]];
  const numbers = Array.from(data);
  const points: ReadPoint[] = [];
  let isCurved = false;
  for (let at = 0; at < numbers.length;) {
    const step = numbers[at] ?? 0;
    const count = POINTS_OF_STEP[step] ?? 0;
    isCurved ||= count > 1;
    at += 1 + 2 * count;
    if (count > 0) points.push(onPaper(state.matrix, numbers[at - 2] ?? 0, numbers[at - 1] ?? 0, heightMm));
  }
  const scale = Math.hypot(state.matrix[0], state.matrix[1]) * MM_PER_POINT;
  return {
    isStroked: paint === OPS.stroke || paint === OPS.closeStroke,
    lineWidthMm: state.lineWidth * scale,
    isDashed: state.isDashed,
    isCurved,
    points,
    box: boxOf(points),
  };
}

function onPaper(m: Matrix, x: number, y: number, heightMm: number): ReadPoint {
  return {
    x: (m[0] * x + m[2] * y + m[4]) * MM_PER_POINT,
    y: heightMm - (m[1] * x + m[3] * y + m[5]) * MM_PER_POINT,
  };
}

export function boxOf(points: readonly ReadPoint[]): ReadBox {
  const [xs, ys] = [points.map(({ x }) => x), points.map(({ y }) => y)];
  return { left: Math.min(...xs), right: Math.max(...xs), top: Math.min(...ys), bottom: Math.max(...ys) };
}

const CAPITALS = 0.66;

function readText(item: { str: string; width: number; transform: number[] }, heightMm: number): ReadText {
  const [a = 1, b = 0, c = 0, d = 1, e = 0, f = 0] = item.transform;
  const size = Math.hypot(c, d);
  const along = { x: a / Math.hypot(a, b), y: b / Math.hypot(a, b) };
  const up = { x: c / size, y: d / size };
  const corners = [0, 1].flatMap((w) =>
    [0, CAPITALS].map((h) => ({
      x: (e + along.x * w * item.width + up.x * h * size) * MM_PER_POINT,
      y: heightMm - (f + along.y * w * item.width + up.y * h * size) * MM_PER_POINT,
    })),
  );
  return { text: item.str, sizeMm: size * MM_PER_POINT, isUpright: Math.abs(b) < 1e-6, box: boxOf(corners) };
}
