import type { CSSProperties, InputHTMLAttributes } from 'react';
import Search from 'lucide-react-native/icons/search';
import X from 'lucide-react-native/icons/x';
import { color, face } from '@/components/theme';
import { Icon, IconButton, Key } from '@/components/ui';
import type { Locator } from '../use-locator';

/** What is typed, and the list it opens: none before the list's code is here. */
export type LocatorEntry = Pick<Locator, 'text' | 'write' | 'ask'> & { box?: Locator['box'] };

interface LocatorInputProps {
  locator: LocatorEntry;
  /** The tall one of the full screen. */
  large?: boolean;
  autoFocus?: boolean;
}

const frame = (large: boolean): CSSProperties => ({
  display: 'flex',
  alignItems: 'center',
  gap: 8,
  height: large ? 52 : 'var(--hit)',
  padding: large ? '0 4px 0 14px' : '0 4px 0 12px',
  border: `1.5px solid ${color.lineControl}`,
  borderRadius: 4,
  background: color.raised,
});

/** Where an address is typed. Enter goes, Esc closes. */
export function LocatorInput({ locator, large = false, autoFocus }: LocatorInputProps) {
  const { box, text, write, ask } = locator;
  const own: InputHTMLAttributes<HTMLInputElement> = {
    'aria-label': 'Find a residue',
    placeholder: large ? 'cE59, βK158, K:59' : 'Find a residue: cE59, βK158, K:59',
    autoFocus,
    spellCheck: false,
    autoCapitalize: 'off',
    autoCorrect: 'off',
    enterKeyHint: 'go',
    inputMode: 'search',
    maxLength: 200,
    value: text,
    // Written here and not by the list's own state, so that the caret stays where it is.
    onChange: (event) => write(event.currentTarget.value),
    onKeyDown: (event) => {
      if (event.key !== 'Enter' || event.nativeEvent.isComposing) return;
      if (box && box.highlightedIndex >= 0) return;
      event.preventDefault();
      Object.assign(event.nativeEvent, { preventDownshiftDefault: true });
      ask();
    },
  };
  const input = box ? box.getInputProps(own) : own;
  return (
    <div className="control" style={frame(large)}>
      <Icon of={Search} tone="soft" />
      <input
        {...input}
        style={{
          flex: 1,
          minWidth: 0,
          height: '100%',
          border: 0,
          background: 'none',
          color: color.ink,
          font: `400 ${large ? '20px' : 'var(--control-size)'}/24px ${text ? face.mono : face.text}`,
        }}
      />
      {text === '' && !large ? (
        <span style={{ paddingRight: 8 }} aria-hidden>
          <Key>/</Key>
        </span>
      ) : null}
      {text !== '' ? <IconButton icon={X} label="Empty the box" onPress={() => write('')} /> : null}
    </div>
  );
}
