import { codeOfLetter } from '../alphabet';
import { readBodies, type AddressBody } from './body';
import { describeBody, reasonOfBody, spellAlone, spellBehindFamily } from './describe-reading';
import { normalizeAddressText } from './normalize-text';
import { notReadAs } from './not-read-as';
import { splitQualifiers, writeQualifiers } from './qualifiers';
import { readChainAddress } from './read-chain';
import { readFamilies, type FamilyReading } from './read-family';
import { MAX_ADDRESS_LENGTH, type AddressContext, type AddressReading, type AddressResult } from './types';

type Core = Omit<AddressReading, 'organism' | 'numbering'>;

const joined = (...parts: string[]) => parts.filter((part) => part !== '').join('; ');

function fromFamily({ match, body }: FamilyReading): Core {
  const { family, typed, how } = match;
  const why = {
    exact: `${typed} is family ${family.name}`,
    'other-case': `${typed} may be family ${family.name}, in other case`,
    lookalike: `${typed} may be typed for ${family.name}`,
  }[how];
  return {
    kind: 'family',
    family: family.name,
    chainId: null,
    letter: body.letter,
    label: body.label,
    mutationTo: body.mutationTo,
    atom: null,
    group: `Family ${family.name}, ${describeBody(body)}`,
    reason: joined(why, reasonOfBody(body)),
    spelling: `${family.name}${spellBehindFamily(body)}`,
  };
}

function fromBody(body: AddressBody): Core {
  const { letter, label, mutationTo } = body;
  const what = letter === null ? 'number alone' : 'no family is named';
  const change = mutationTo === null ? '' : `, changed to ${codeOfLetter(mutationTo)}`;
  const stated = letter === null ? `Number ${label}` : `Amino acid ${codeOfLetter(letter)}, number ${label}`;
  return {
    kind: letter === null ? 'number' : 'amino-acid',
    family: null,
    chainId: null,
    letter,
    label,
    mutationTo,
    atom: null,
    group: `${stated}${change}`,
    reason: joined(reasonOfBody(body), `${what}: any protein may hold it`),
    spelling: spellAlone(body),
  };
}

function fromChain(text: string, context: AddressContext): Core[] {
  const chain = readChainAddress(text, context);
  if (chain === null) return [];
  const { chainId, label, atom, how } = chain;
  const why = {
    exact: `${chainId} is a chain, ${label} its author number`,
    'other-case': `there is a chain ${chainId}, in other case`,
    'no-colon': `there is a chain ${chainId}; the colon may have been left out`,
  }[how];
  return [
    {
      kind: 'chain',
      family: null,
      chainId,
      letter: null,
      label,
      mutationTo: null,
      atom,
      group: `Chain ${chainId}, author number ${label}`,
      reason: why,
      spelling: `${chainId}:${label}${atom === null ? '' : ` ${atom}`}`,
    },
  ];
}

/** A colon behind something that is no chain, as typed, is taken for the separator behind a family. */
function readWithoutQualifiers(text: string, context: AddressContext): Core[] {
  const chains = fromChain(text, context);
  if (text.includes(':')) {
    const chain = chains[0];
    if (chain !== undefined && text.startsWith(chain.chainId ?? ':')) return chains;
    return [...chains, ...readFamilies(text.replace(/ ?: ?/, '_'), context.families).map(fromFamily)];
  }
  const families = readFamilies(text, context.families);
  // A family in its own case, or one an amino acid speaks for, comes before "any protein"; a guess comes after.
  const isLikely = ({ match, body }: FamilyReading) => match.how === 'exact' || body.letter !== null;
  return [
    ...families.filter(isLikely).map(fromFamily),
    ...readBodies(text).map(fromBody),
    ...families.filter((family) => !isLikely(family)).map(fromFamily),
    ...chains,
  ];
}

/**
 * Everything a typed address can mean, by its form and the names a project has; nothing is guessed and nothing is
 * looked up. Grammar: `[family sep?] body [at]`, `chain:number`, or a number; body = `[aa]number[insertion][aa]`;
 * `#52A` is a label as written; at = `@ organism` and `{numbering}` (handbook of the field, address grammar).
 * An empty list means that the text is no address. Never throws, whatever the text.
 */
export function readAddress(text: string, context: AddressContext): AddressResult {
  if (text.length > MAX_ADDRESS_LENGTH)
    return { readings: [], notReadAs: [`An address has at most ${MAX_ADDRESS_LENGTH} characters.`] };
  const { rest, organism, numbering } = splitQualifiers(normalizeAddressText(text));
  const qualifiers = writeQualifiers({ organism, numbering });
  const seen = new Set<string>();
  const readings = readWithoutQualifiers(rest, context)
    .map((core) => ({ ...core, organism, numbering, spelling: `${core.spelling}${qualifiers}` }))
    .filter((reading) => {
      const { family, chainId, letter, label, mutationTo } = reading;
      const key = JSON.stringify([family, chainId, letter, label, mutationTo]);
      return !seen.has(key) && Boolean(seen.add(key));
    });
  return { readings, notReadAs: notReadAs(rest, readings, context) };
}
