export interface ScaleTick {
  /** Zero-based place on the chain. */
  index: number;
  kind: 'minor' | 'middle' | 'major';
  /** Only majors carry a number. */
  label?: string;
}

const majorSteps = [10, 20, 50, 100, 200, 500, 1000, 2000, 5000, 10000];
const mostMajors = 10;

/** The distance between two numbers on a scale of this many residues, so that at most ten are written. */
export const majorStep = (length: number): number =>
  majorSteps.find((step) => length / step <= mostMajors) ?? Math.ceil(length / mostMajors);

/**
 * The ticks of a chain of `length` residues, by their labels: major at whole steps, middle at half, minor at a tenth.
 * Labels that are no whole number (52A) carry no tick, so the scale never shows a number that is nobody's label.
 */
export function scaleTicks(length: number, labelAt: (index: number) => string): ScaleTick[] {
  const major = majorStep(length);
  const ticks: ScaleTick[] = [];
  for (let index = 0; index < length; index += 1) {
    const label = labelAt(index);
    if (!/^-?\d+$/.test(label)) continue;
    const number = Number(label);
    if (number % major === 0) ticks.push({ index, kind: 'major', label });
    else if (number % (major / 2) === 0) ticks.push({ index, kind: 'middle' });
    else if (number % (major / 10) === 0) ticks.push({ index, kind: 'minor' });
  }
  return ticks;
}

/** Where the middle of a residue stands on a scale of 100 percent. */
export const placePercent = (index: number, length: number): number =>
  length <= 0 ? 0 : ((index + 0.5) / length) * 100;
