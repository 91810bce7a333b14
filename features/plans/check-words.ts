import type { Design } from '@/shared/contracts/plans';

type Check = Design['checks'][number];
export type CheckResult = 'passed' | 'look' | 'failed';

/** One line of the list of checks: figures of both primers held against one limit. */
export interface CheckLine {
  /** Stable, as in the contract. */
  key: string;
  result: CheckResult;
  name: string;
  value: string;
  limit: string;
}

const order: CheckResult[] = ['passed', 'look', 'failed'];

export function resultOf({ passed, severity }: Pick<Check, 'passed' | 'severity'>): CheckResult {
  if (passed) return 'passed';
  return severity === 'limit' ? 'failed' : 'look';
}

/** A figure as people read it: whole, or with one decimal; a real minus sign. */
export function figure(value: number | null): string {
  if (value === null) return 'not known';
  const rounded = Math.round(value * 10) / 10;
  const text = Number.isInteger(rounded) ? String(Math.abs(rounded)) : Math.abs(rounded).toFixed(1);
  return rounded < 0 ? `−${text}` : text;
}

/** The checks of a design, the same check of both primers in one line; the worse result counts. */
export function checkLines(checks: readonly Check[]): CheckLine[] {
  const groups = new Map<string, Check[]>();
  for (const check of checks) groups.set(check.name, [...(groups.get(check.name) ?? []), check]);
  return [...groups].map(([key, group]) => lineOf(key, group));
}

/** All checks of a design and, last, whether its product was read back. */
export function linesOfDesign(design: Pick<Design, 'checks' | 'proved' | 'proof'>): CheckLine[] {
  const proof: CheckLine = {
    key: 'read-back',
    result: design.proved ? 'passed' : 'failed',
    name: 'Read back from the DNA',
    value: design.proved ? 'this change and no other' : 'not proved',
    limit: design.proof,
  };
  return [...checkLines(design.checks), proof];
}

function lineOf(key: string, group: readonly Check[]): CheckLine {
  const [first] = group;
  const label = first?.label ?? key;
  const comma = label.lastIndexOf(', ');
  const [name, unit] = comma < 0 ? [label, ''] : [label.slice(0, comma), label.slice(comma + 2)];
  const results = group.map(resultOf);
  const result = order[Math.max(...results.map((one) => order.indexOf(one)))] ?? 'failed';
  const figures = group.map(({ value }) => figure(value));
  const shown = new Set(figures).size === 1 ? figures.slice(0, 1) : figures;
  const concerned = group.flatMap((check) =>
    check.primer && resultOf(check) === result && result !== 'passed' ? [check.primer] : [],
  );
  const where =
    concerned.length > 0 && concerned.length < group.length ? `only ${concerned.join(', ')} · ` : '';
  return {
    key,
    result,
    name,
    value: `${shown.join(' and ')}${unit ? ` ${unit}` : ''}`,
    limit: `${where}limit: ${minusSigns(first?.limit ?? 'none')} · ${first?.basis ?? ''}`,
  };
}

/** Limits are written with the same minus as the figures beside them. */
const minusSigns = (limit: string): string => limit.replace(/(?<!\S)-(?=\d)/g, '−');

/** `11 passed, 1 to look at`. */
export function summaryOf(lines: readonly Pick<CheckLine, 'result'>[]): string {
  const count = (result: CheckResult) => lines.filter((line) => line.result === result).length;
  return [
    `${count('passed')} passed`,
    count('look') > 0 ? `${count('look')} to look at` : '',
    count('failed') > 0 ? `${count('failed')} failed` : '',
  ]
    .filter(Boolean)
    .join(', ');
}

export function worstOf(lines: readonly Pick<CheckLine, 'result'>[]): CheckResult {
  return order[Math.max(0, ...lines.map(({ result }) => order.indexOf(result)))] ?? 'passed';
}

/** The design a mutant is judged by: the chosen one, else the best that is proved. */
export function leadingDesign<D extends Pick<Design, 'chosen' | 'proved'>>(
  designs: readonly D[],
): D | undefined {
  const proved = designs.filter((design) => design.proved);
  return proved.find(({ chosen }) => chosen) ?? proved[0];
}
