import { codeOfLetter, nameOfLetter } from '../alphabet';
import { mayBeNegative, type AddressBody } from './body';

/** `Glu59`, `Glu59 to Gln`, `residue 59`, `residue 59 to Ala`. */
export function describeBody({ letter, label, mutationTo }: AddressBody): string {
  const residue = letter === null ? `residue ${label}` : `${codeOfLetter(letter)}${label}`;
  return mutationTo === null ? residue : `${residue} to ${codeOfLetter(mutationTo)}`;
}

/** Why the letters and digits of a body can be read so. */
export function reasonOfBody(body: AddressBody): string {
  const parts: string[] = [];
  if (body.letter !== null)
    parts.push(`${codeOfLetter(body.letter)} is ${nameOfLetter(body.letter).toLowerCase()}`);
  if (body.tail === 'insertion') parts.push(`the letter behind the number is an insertion letter`);
  if (body.mutationTo !== null)
    parts.push(`what stands behind the number is a change to ${nameOfLetter(body.mutationTo).toLowerCase()}`);
  if (body.sign === 'minus') parts.push('the sign is a minus');
  if (body.sign === 'separator') parts.push('the sign is a hyphen');
  return parts.join('; ');
}

/** A body spelled behind a family so that one reading is left: `-E59`, `_62`, `-210`, `#52A`. */
export function spellBehindFamily({ letter, label, mutationTo }: AddressBody): string {
  if (mutationTo === null && /[A-Za-z]$/.test(label))
    return letter === null ? `#${label}` : `-${codeOfLetter(letter)}#${label}`;
  // A hyphen before a short number could be a minus.
  const separator = letter === null && (label.startsWith('-') || mayBeNegative(label)) ? '_' : '-';
  const to = mutationTo === null ? '' : letter === null ? codeOfLetter(mutationTo) : mutationTo;
  return `${separator}${letter ?? ''}${label}${to}`;
}

/** A body spelled alone so that one reading is left: `Glu59`, `Glu59Gln`, `59`, `#52A`. */
export function spellAlone({ letter, label, mutationTo }: AddressBody): string {
  const from = letter === null ? '' : codeOfLetter(letter);
  const to = mutationTo === null ? '' : codeOfLetter(mutationTo);
  const endsInLetter = /[A-Za-z]$/.test(label) && mutationTo === null;
  const isLiteral = endsInLetter || (letter !== null && label.startsWith('-'));
  return `${from}${isLiteral ? '#' : ''}${label}${to}`;
}
