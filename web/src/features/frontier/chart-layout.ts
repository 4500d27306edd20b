import type { Box, Geometry } from './chart-geometry';
import { holds, grown, overlap, placeLabel } from './place-labels';

interface Mark {
  x: number;
  y: number;
  /** The words of its box. */
  text: string;
}

interface LayoutInput {
  geometry: Geometry;
  /** The kept portfolios in px, in order of cost. */
  line: readonly (readonly [x: number, y: number])[];
  a: Mark;
  b?: Mark;
  /** Where the next step ends; its box is the flag. */
  next?: Mark;
  knee?: Mark;
  /** x of the ceiling's line. */
  ceilingX?: number;
  withGlass: boolean;
}

export interface Layout {
  a: Box;
  b?: Box;
  next?: Box;
  knee?: Box;
  glass?: Box;
}

const BOX_HEIGHT = 20;
const KNEE_TEXT_WIDTH = 188;
export const KNEE_FULL_HEIGHT = 32;
const GLASS_INSET = 14;
const GLASS_SIZES = [
  { width: 286, height: 148 },
  { width: 220, height: 114 },
];

/** Where each label of the chart stands: in turn, each away from those before it and, where it can, off the line. */
export function layoutLabels(input: LayoutInput): Layout {
  const { geometry, line, a, b, next, knee } = input;
  const taken: Box[] = marksOf(input);
  const avoid = [...line, ...ceilingPoints(input)];
  const put = (choices: Box[]) => {
    const box = placeLabel(choices, { taken, avoid, within: geometry.plot });
    taken.push(box);
    return box;
  };
  const layout: Layout = { a: put(besideMark(a)) };
  if (next) layout.next = put(flags(next));
  layout.glass = input.withGlass ? glassPlace(input, taken) : undefined;
  if (layout.glass) taken.push(layout.glass);
  if (b) layout.b = put(besideMark(b));
  if (knee) layout.knee = put(kneePlaces(knee));
  return layout;
}

/** What labels stay away from: the letters on the line, the plumb lines below them, and the square of the knee. */
function marksOf({ geometry, a, b, knee }: LayoutInput): Box[] {
  const foot = geometry.plot.y + geometry.plot.height;
  const letters = [a, ...(b ? [b] : [])].flatMap(({ x, y }) => [
    { x: x - 4, y: y - 16, width: 8, height: 22 },
    { x, y, width: 1, height: Math.max(0, foot - y) },
  ]);
  return knee ? [...letters, { x: knee.x - 24, y: knee.y - 24, width: 16, height: 16 }] : letters;
}

function ceilingPoints({ geometry: { plot }, ceilingX }: LayoutInput): [number, number][] {
  if (ceilingX === undefined) return [];
  return Array.from({ length: Math.ceil(plot.height / 8) }, (_, i) => [ceilingX, plot.y + i * 8]);
}

function besideMark({ x, y, text }: Mark): Box[] {
  const width = boxWidth(text);
  return [
    [x - width - 30, y - 50],
    [x - width - 30, y - 34],
    [x - width - 54, y - 74],
    [x - width / 2, y - 66],
    [x + 26, y - 58],
    [x + 18, y + 22],
    [x - width - 18, y + 22],
    [x + 30, y + 60],
    [x - width - 30, y + 60],
  ].map(([left = 0, top = 0]) => ({ x: left, y: top, width, height: BOX_HEIGHT }));
}

function flags({ x, y, text }: Mark): Box[] {
  const width = boxWidth(text);
  return [-46, -70, -94, -118].flatMap((up) => [
    { x: x - width, y: y + up, width, height: BOX_HEIGHT },
    { x, y: y + up, width, height: BOX_HEIGHT },
  ]);
}

/** In full on the free side of the square; only its name and cost where that has no room. */
function kneePlaces({ x, y }: Mark): Box[] {
  const full = { width: KNEE_TEXT_WIDTH, height: KNEE_FULL_HEIGHT };
  const short = { width: 90, height: 18 };
  return [
    { x: x - 41 - full.width, y: y - 36, ...full },
    { x: x - 12 - full.width, y: y - 72, ...full },
    { x: x - 41 - short.width, y: y - 30, ...short },
    { x: x - 8 - short.width, y: y - 56, ...short },
    { x: x - short.width / 2, y: y - 56, ...short },
    { x: x + 16, y: y + 12, ...short },
    { x: x + 40, y: y + 40, ...short },
  ];
}

/** Top left, where a frontier usually leaves room; undefined where it does not. */
function glassPlace({ geometry: { plot }, line }: LayoutInput, taken: readonly Box[]): Box | undefined {
  const places = GLASS_SIZES.map((size) => ({ x: plot.x + GLASS_INSET, y: plot.y + GLASS_INSET, ...size }));
  return places.find((glass) => {
    const meets = taken.some((box) => overlap(grown(glass, 12), box) > 0);
    const covers = line.some(([x, y]) => holds(grown(glass, 10), x, y));
    return !meets && !covers;
  });
}

/** Public Sans 700 at 12.5 px is about 7.2 px a character, wide ones included. */
function boxWidth(text: string): number {
  return Math.round(text.length * 7.2 + 14);
}
