import type { StructureModel } from './types';

export interface StructureSummary {
  format: StructureModel['format'];
  models: number;
  chains: {
    id: string;
    labelIds: string[];
    kind: 'protein' | 'nucleic' | 'other';
    declared: string | null;
    observed: string;
    residues: {
      label: string;
      name: string;
      letter: string;
      parent?: string;
      atoms: number;
      alternates: number;
    }[];
    ligands: { name: string; label: string }[];
    waters: number;
  }[];
  /** Atoms kept: one position each, ligands and waters among them. */
  atoms: number;
}

/** A model as plain data without its atoms: what the `structure` command prints and a person asks of a file. */
export function summariseStructure(model: StructureModel): StructureSummary {
  return {
    format: model.format,
    models: model.modelCount,
    chains: model.chains.map((chain) => ({
      id: chain.id,
      labelIds: chain.labelIds,
      kind: chain.kind,
      declared: chain.declared,
      observed: chain.observed,
      residues: chain.residues.map(({ label, name, letter, parent, atomCount, alternates }) => ({
        label,
        name,
        letter,
        ...(parent === undefined ? {} : { parent }),
        atoms: atomCount,
        alternates,
      })),
      ligands: chain.ligands.map(({ name, label }) => ({ name, label })),
      waters: chain.waters,
    })),
    atoms: model.atoms.count,
  };
}
