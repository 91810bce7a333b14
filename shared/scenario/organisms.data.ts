/** Invented organisms: none of these names belongs to a known species. */
export const organisms = [
  'Orvella tarda',
  'Ostravella minor',
  'Salivena maris',
  'Halverina salsa',
  'Thermolira ampla',
  'Quessimonas lenta',
  'Brundivola clara',
  'Cryorota nivalis',
  'Pelvissonia rubra',
  'Nerivola profunda',
] as const;

export type Organism = (typeof organisms)[number];

/** The organism that the coordinate file and the construct are of. */
export const modelOrganism: Organism = 'Orvella tarda';

/** A branch of the invented tree. Length: chance that an average variable site is substituted along it. */
export interface Branch {
  name: string;
  length: number;
  children: Branch[];
}

const tip = (name: Organism, length: number): Branch => ({ name, length, children: [] });

/** How the invented organisms are related. Inner branches are named so that insertions and deletions can be put on them. */
export const tree: Branch = {
  name: 'root',
  length: 0,
  children: [
    {
      name: 'temperate',
      length: 0.12,
      children: [
        { name: 'slow', length: 0.1, children: [tip('Orvella tarda', 0.06), tip('Ostravella minor', 0.07)] },
        { name: 'salt', length: 0.1, children: [tip('Salivena maris', 0.13), tip('Halverina salsa', 0.12)] },
      ],
    },
    {
      name: 'warm',
      length: 0.14,
      children: [
        tip('Thermolira ampla', 0.2),
        {
          name: 'spring',
          length: 0.08,
          children: [tip('Quessimonas lenta', 0.16), tip('Brundivola clara', 0.15)],
        },
      ],
    },
    {
      name: 'deep',
      length: 0.18,
      children: [
        {
          name: 'cold',
          length: 0.1,
          children: [tip('Cryorota nivalis', 0.15), tip('Pelvissonia rubra', 0.12)],
        },
        tip('Nerivola profunda', 0.3),
      ],
    },
  ],
};
