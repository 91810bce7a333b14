/** Stands on every primer list, order and export. */
export const PRIMER_CAUTION =
  "Check the design before you order. Follow your institution's rules on biosafety and recombinant DNA; this tool does not replace review by a qualified person.";

/** Stands beside calculated figures. */
export const FIGURES_CAUTION = 'Calculated for the stated concentrations; real reactions differ.';
