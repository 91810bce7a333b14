/*
 * The residue label and what belongs to it. Colours by part of the motor, edge by evidence.
 *   Plate        family part code number becomes? size? evidence? grade? selected? struck? numbering? organism? href? onPress?
 *   BigPlate     the same words + verdict? level?            (the page's h1)
 *   FamilyTag    family part size? href?
 *   partWords    [part]: its name
 *   Evidence     edge                                        Grade  grade
 *   ChainScale   part length current? labelAt? spans? pins? caption   (indices zero-based)
 *   ShareBars    shares[{ letter, rowCount, share }] own? label
 *   SequenceGrid letters[{ code, number, href }] label        (rows of ten with a ruler; arrows walk)
 *   spokenResidue, shortLabel, wordsForCode                  words without a picture
 *   plateWords   the words of a Plate for a residue of the contract: <Plate {...plateWords(residue)} />
 */
export { Plate } from './plate';
export type { PlateSize } from './plate-style';
export { BigPlate } from './big-plate';
export { FamilyTag } from './family-tag';
export { partWords } from './part-glyph';
export { Evidence, Grade } from './evidence';
export { ChainScale } from './chain-scale';
export { ShareBars, type LetterShare } from './share-bars';
export { SequenceGrid } from './sequence-grid';
export {
  plateWords,
  shortLabel,
  spokenResidue,
  wordsForCode,
  type EvidenceEdge,
  type GradeName,
} from './residue-words';
