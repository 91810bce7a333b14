/*
 * The residue label and what belongs to it. Colours by part of the motor, edge by evidence.
 *   Plate        family part code number becomes? size? evidence? grade? selected? struck? numbering? organism? href? onPress?
 *   BigPlate     the same words + verdict? level?            (the page's h1)
 *   FamilyTag    family part size? href?
 *   PartGlyph    part sizePixels? stroke?                    partWords[part]
 *   Evidence     edge                                        Grade  grade
 *   ChainScale   part length current? labelAt? spans? pins? caption   (indices zero-based)
 *   ShareBars    shares[{ letter, rowCount, share }] own? label
 *   SequenceLine letters[{ code, number, href?, current? }] label tints?
 *   SequenceGrid letters[{ code, number, href }] label        (rows of ten with a ruler; arrows walk)
 *   ChemistryCue chemistry                                   IndexMark lineHeightPixels? tone?
 *   spokenResidue, shortLabel, wordsForCode                  words without a picture
 *   plateWords   the words of a Plate for a residue of the contract: <Plate {...plateWords(residue)} />
 */
export { Plate, type PlateProps } from './plate';
export type { PlateSize } from './plate-style';
export { BigPlate, type BigPlateProps } from './big-plate';
export { FamilyTag, type FamilyTagProps } from './family-tag';
export { PartGlyph, partWords, type PartGlyphProps } from './part-glyph';
export { Evidence, Grade } from './evidence';
export { ChainScale, type ChainScaleProps, type ScaleSpan } from './chain-scale';
export { ShareBars, shareWords, type LetterShare, type ShareBarsProps } from './share-bars';
export { SequenceLine, type SequenceLetter, type SequenceLineProps } from './sequence-line';
export { SequenceGrid, type SequenceGridProps } from './sequence-grid';
export { ChemistryCue } from './chemistry-cue';
export { IndexMark } from './index-mark';
export {
  evidenceWords,
  plateWords,
  shortLabel,
  spokenResidue,
  wordsForCode,
  type EvidenceEdge,
  type GradeName,
  type ResidueWords,
} from './residue-words';
export { aminoAcidWords, type AminoAcidWords, type Chemistry } from './amino-acid-words.data';
