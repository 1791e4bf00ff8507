import type { Units } from '../user';
import { px, type Primitive, type TextPrimitive } from './primitives';
import { textWidth } from './textWidth';
import { metreNumeral } from './zones';

const METRES_PER_FOOT = 0.3048;
/** Numerals stand at least this far apart, from middle to middle. */
const LEAST_NUMERAL_STEP = 24;
/** Each digit past the third needs as much more. */
const MORE_DIGIT = 10;
/** Ticks that are closer than this run together. */
const LEAST_TICK_STEP = 3.5;

interface Division {
  /** Of one unit of the ruler (a foot or a metre). */
  step: number;
  /** Height of the tick that stands at a multiple of `step`, by the largest division it is on. */
  heightAt: (tick: number) => number;
}

function feetDivision(pixelsPerFoot: number): Division {
  const inches = pixelsPerFoot >= 46 ? 1 : pixelsPerFoot >= 24 ? 3 : 6;
  return {
    step: inches / 12,
    heightAt: (tick) => {
      const at = tick * inches;
      return at % 12 === 0 ? 15 : at % 6 === 0 ? 10 : at % 3 === 0 ? 7 : 4;
    },
  };
}

function metreDivision(): Division {
  return {
    step: 0.1,
    heightAt: (tick) => (tick % 10 === 0 ? 15 : tick % 5 === 0 ? 10 : 4),
  };
}

/** The first of the steps, or of their tens, hundreds and so on, that is wide enough to be read. */
function leastStep(steps: readonly number[], pixelsPerUnit: number, least: number): number {
  for (let power = 1; ; power *= 10) {
    const step = steps.find((units) => units * power * pixelsPerUnit >= least);
    if (step !== undefined) return step * power;
  }
}

/** Coarser steps for distances beyond what the scales of the strip were made for. */
function coarseDivision(pixelsPerUnit: number): Division {
  const step = leastStep([1, 5], pixelsPerUnit, LEAST_TICK_STEP);
  return { step, heightAt: (tick) => (tick % 5 === 0 ? 15 : 7) };
}

interface RulerInput {
  x: number;
  y: number;
  right: number;
  pixelsPerFoot: number;
  units: Units;
}

/** The ruler of a strip: a line, ticks below it and numerals below the ticks. */
export function ruler({ x, y, right, pixelsPerFoot, units }: RulerInput): Primitive[] {
  const metric = units === 'metric';
  const pixelsPerUnit = metric ? pixelsPerFoot / METRES_PER_FOOT : pixelsPerFoot;
  const fine = metric ? metreDivision() : feetDivision(pixelsPerFoot);
  const division =
    fine.step * pixelsPerUnit >= LEAST_TICK_STEP ? fine : coarseDivision(pixelsPerUnit);

  let ticks = '';
  const step = division.step * pixelsPerUnit;
  for (let tick = 0; x + tick * step <= right; tick += 1) {
    ticks += `M${px(x + tick * step)} ${px(y)}v${division.heightAt(tick)}`;
  }
  return [
    { kind: 'path', d: `M${px(x)} ${px(y)}H${px(right)}`, stroke: 'ink', width: 2 },
    { kind: 'path', d: ticks, stroke: 'ink', width: 1 },
    ...numerals({ x, y, right, pixelsPerUnit, metric }),
  ];
}

function numerals(input: {
  x: number;
  y: number;
  right: number;
  pixelsPerUnit: number;
  metric: boolean;
}): TextPrimitive[] {
  const { x, y, right, pixelsPerUnit, metric } = input;
  const common = { kind: 'text', y: y + 30, size: 14, weight: 500, role: 'note', halo: 0 } as const;
  const unit = metric ? 'm' : 'ft';
  const texts: TextPrimitive[] = [{ ...common, x: right, text: unit, anchor: 'end' }];
  const end = right - textWidth(unit, 14, 500) - 8;
  const steps = metric ? [0.5, 1, 2] : [1, 2, 5];
  const digits = String(Math.floor((right - x) / pixelsPerUnit)).length;
  const least = LEAST_NUMERAL_STEP + Math.max(0, digits - 3) * MORE_DIGIT;
  const step = leastStep(steps, pixelsPerUnit, least);
  for (let count = 0; ; count += 1) {
    const text = metric ? metreNumeral(count * step) : String(count * step);
    const at = x + count * step * pixelsPerUnit;
    if (at + textWidth(text, 14, 500) / 2 > end) return texts;
    // The first numeral starts at the edge instead of hanging over it.
    texts.push(
      count === 0
        ? { ...common, x: 0, text, anchor: 'start' }
        : { ...common, x: at, text, anchor: 'middle' },
    );
  }
}
