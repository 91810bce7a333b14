import type { Xyz } from './scenario-types';

export const add = (a: Xyz, b: Xyz): Xyz => [a[0] + b[0], a[1] + b[1], a[2] + b[2]];
export const subtract = (a: Xyz, b: Xyz): Xyz => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
export const scale = (a: Xyz, factor: number): Xyz => [a[0] * factor, a[1] * factor, a[2] * factor];
export const dot = (a: Xyz, b: Xyz): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
export const cross = (a: Xyz, b: Xyz): Xyz => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];
export const unit = (a: Xyz): Xyz => scale(a, 1 / Math.sqrt(dot(a, a)));
export const distance = (a: Xyz, b: Xyz): number => Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2]);
export const radians = (degrees: number): number => (degrees * Math.PI) / 180;

/** Right-handed turn of a vector about a unit axis through the origin (Rodrigues' formula). */
export function turn(a: Xyz, axis: Xyz, degrees: number): Xyz {
  const angle = radians(degrees);
  const along = scale(axis, dot(a, axis) * (1 - Math.cos(angle)));
  return add(add(scale(a, Math.cos(angle)), scale(cross(axis, a), Math.sin(angle))), along);
}
