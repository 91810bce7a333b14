/** Any hyphen, dash or minus a keyboard or a paper may give. */
const HYPHENS = /[\u2010-\u2015\u2212\uFE58\uFE63\uFF0D]/g;
const PRIMES = /[\u2018\u2019\u2032\u00B4`]/g;
const INVISIBLE = /[\u00AD\u200B-\u200F\u2060\uFEFF]/g;

/**
 * One spelling for what looks the same: NFKC (full-width and subscript digits, the Greek symbols ϐ and ϵ, the
 * micro sign), ß as β, every minus as a hyphen, every prime as an apostrophe, blanks as one space.
 */
export function normalizeAddressText(text: string): string {
  return text
    .normalize('NFKC')
    .replace(/\u00DF/g, 'β')
    .replace(HYPHENS, '-')
    .replace(PRIMES, "'")
    .replace(INVISIBLE, '')
    .replace(/\s+/g, ' ')
    .trim();
}
