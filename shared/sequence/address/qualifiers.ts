/** What stands behind an address: `@ organism` and `{numbering}`, in either order. */
export interface Qualifiers {
  rest: string;
  organism: string | null;
  numbering: string | null;
}

/** Takes the qualifiers off; an empty one counts as none. */
export function splitQualifiers(text: string): Qualifiers {
  let rest = text;
  let organism: string | null = null;
  let numbering: string | null = null;
  for (let round = 0; round < 2; round += 1) {
    const braces = /^(.*?)\s*\{([^{}]*)\}$/.exec(rest);
    if (braces !== null && numbering === null) {
      rest = braces[1] ?? '';
      numbering = (braces[2] ?? '').trim();
    }
    const at = /^([^@]*?)\s*@\s*([^@{}]*)$/.exec(rest);
    if (at !== null && organism === null) {
      rest = at[1] ?? '';
      organism = (at[2] ?? '').trim();
    }
  }
  return {
    rest: rest.trim(),
    organism: organism === '' ? null : organism,
    numbering: numbering === '' ? null : numbering,
  };
}

/** The qualifiers as they are written behind a spelling. */
export function writeQualifiers({ organism, numbering }: Omit<Qualifiers, 'rest'>): string {
  return `${numbering === null ? '' : ` {${numbering}}`}${organism === null ? '' : ` @ ${organism}`}`;
}
