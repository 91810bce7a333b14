import type { OptimalPaths } from './optimal-paths';

/**
 * The partner each residue of `a` has in every optimal alignment, or −1 when optimal alignments differ
 * or leave it unpaired. Index: residue of a, from 0; value: residue of b, from 0.
 *
 * Any alignment takes residue i of `a` in exactly one step, a pair or alone, at one column of `b`. So a
 * pair belongs to all optimal alignments exactly when it is the only step taking i on any optimal way.
 * Limits: says nothing about alignments that are nearly as good (a wrong pairing may be the only best one).
 */
export function pairsInEveryOptimal(paths: OptimalPaths): Int32Array {
  const { lengthA, lengthB, previous } = paths;
  const width = lengthB + 1;
  const partners = new Int32Array(lengthA).fill(-1);
  // Step kinds that lie on an optimal way, as bits, for the row being walked and the one above it.
  let reached = new Uint8Array(width);
  let above = new Uint8Array(width);
  reached[lengthB] = paths.last;
  for (let i = lengthA; i >= 0; i -= 1) {
    above.fill(0);
    let ways = 0;
    let partner = -1;
    for (let j = lengthB; j >= 0; j -= 1) {
      const kinds = reached[j] as number;
      if (kinds === 0) continue;
      const bits = previous[i * width + j] as number;
      if ((kinds & 1) !== 0 && i > 0 && j > 0) {
        above[j - 1] = (above[j - 1] as number) | (bits & 7);
        ways += 1;
        partner = j - 1;
      }
      if ((kinds & 2) !== 0 && i > 0) {
        above[j] = (above[j] as number) | ((bits >> 3) & 7);
        ways += 1;
        partner = -1;
      }
      if ((kinds & 4) !== 0 && j > 0) reached[j - 1] = (reached[j - 1] as number) | ((bits >> 6) & 7);
    }
    if (i > 0 && ways === 1) partners[i - 1] = partner;
    [reached, above] = [above, reached];
  }
  return partners;
}
