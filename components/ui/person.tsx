import { color, face } from '@/components/theme';

export interface PersonProps {
  name: string;
  /** `here` a filled dot, `was` a hollow one: here when the line was lost. */
  presence?: 'here' | 'was';
}

/** First letters of the first and the last word: Pell Hadwin gives PH, Lin gives L. */
export function initials(name: string): string {
  const words = name.trim().split(/\s+/).filter(Boolean);
  const first = words[0] ?? '';
  const last = words.length > 1 ? (words[words.length - 1] ?? '') : '';
  return (
    [first, last]
      .map((word) => [...word][0] ?? '')
      .join('')
      .toUpperCase() || '?'
  );
}

const presenceWords = { here: 'here', was: 'was here' } as const;

/** A person as square initials; the name is spoken and shown on hover. */
export function Person({ name, presence }: PersonProps) {
  const spoken = presence ? `${name}, ${presenceWords[presence]}` : name;
  return (
    <span
      role="img"
      aria-label={spoken}
      title={spoken}
      style={{
        position: 'relative',
        display: 'inline-grid',
        placeItems: 'center',
        flex: 'none',
        width: 28,
        height: 28,
        border: `1px solid ${color.lineControl}`,
        borderRadius: 3,
        background: color.raised,
        color: color.ink,
        font: `600 12px/1 ${face.mono}`,
      }}
    >
      {initials(name)}
      {presence ? (
        <span
          style={{
            position: 'absolute',
            right: -4,
            bottom: -4,
            width: 9,
            height: 9,
            borderRadius: 9,
            background: presence === 'here' ? color.good : color.paper,
            border: `2px solid ${presence === 'here' ? color.paper : color.inkFaint}`,
            boxSizing: 'content-box',
          }}
        />
      ) : null}
    </span>
  );
}
