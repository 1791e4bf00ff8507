/** One list of points a stroke, in CSS pixels from the pad's top left. */
export type StrokeList = [number, number][][];

export interface SignaturePadProps {
  id?: string;
  value: StrokeList;
  onChange: (strokes: StrokeList) => void;
  /** Printed under the line: who signs. */
  name: string;
  /** Printed after the name. */
  time?: string;
  label?: string;
  hint?: string;
  error?: string;
}

const MAXIMUM = 4096;
const STROKES = 100;
const POINTS = 5000;

const within = (figure: number) => Math.round(Math.min(Math.max(figure, 0), MAXIMUM) * 10) / 10;

/** Keeps to what the record takes: 100 strokes, 5000 points, each from 0 to 4096. */
export function cleanStrokes(strokes: StrokeList): StrokeList {
  const kept = strokes
    .filter((stroke) => stroke.length > 0)
    .slice(0, STROKES)
    .map((stroke) => stroke.map(([x, y]): [number, number] => [within(x), within(y)]));
  const total = kept.reduce((sum, stroke) => sum + stroke.length, 0);
  if (total <= POINTS) return kept;
  // Too many points are thinned evenly; the ends of each stroke stay.
  const step = Math.ceil(total / POINTS) + 1;
  return kept.map((stroke) =>
    stroke.filter((_, index) => index % step === 0 || index === stroke.length - 1),
  );
}
