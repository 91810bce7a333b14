/** What stands around a site, and so which residues it draws from. */
export type Surrounding = 'm' | 'h' | 'l' | 's' | 't';

/**
 * Residues that a site draws from, repeated by weight: m membrane helix, h helix in water, l loop, s strand, t tail.
 * Loosely after the known leanings of residues; invented weights.
 */
export const drawFrom: Record<Surrounding, string> = {
  m: 'LLLLLLIIIIIVVVVVAAAAGGGFFFMMST',
  h: 'AAAAAALLLLLEEEEEEKKKKKQQQRRRRDDIIVVMSTNF',
  l: 'GGGGGSSSSTTTNNNNDDDDKKEEPPPQRAVLY',
  s: 'VVVVVVIIIILLLTTTYYFFKEQRASH',
  t: 'SSSTTTAAAANNNDDEEEKKKQQQGGPLVIM',
};

/** How fast sites of each surrounding change, relative to the branch length. */
export const pace: Record<Surrounding, number> = { m: 0.8, h: 0.9, l: 1.3, s: 0.8, t: 1.6 };

/** Exchanges that BLOSUM62 does not count against (score 0 or more; Henikoff & Henikoff 1992 PNAS 89:10915). */
export const alike: Record<string, string> = {
  A: 'S',
  C: '',
  D: 'EN',
  E: 'DQK',
  F: 'YWLI',
  G: 'A',
  H: 'NY',
  I: 'VLM',
  K: 'REQ',
  L: 'IMV',
  M: 'LIV',
  N: 'DSH',
  P: '',
  Q: 'EKR',
  R: 'KQ',
  S: 'TAN',
  T: 'S',
  V: 'ILM',
  W: 'YF',
  Y: 'FHW',
};
