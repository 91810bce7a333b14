import { useState } from 'react';
import Copy from 'lucide-react-native/icons/copy';
import { Button, type ButtonKind } from './button';

export interface CopyButtonProps {
  text: string;
  children?: string;
  kind?: ButtonKind;
  /** Spoken: what is copied. */
  label?: string;
}

/** Copies and says so; where the browser gives no clipboard (plain HTTP), it says that instead. */
export function CopyButton({ text, children = 'Copy', kind = 'quiet', label }: CopyButtonProps) {
  const [outcome, setOutcome] = useState<'copied' | 'refused'>();
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(text);
      setOutcome('copied');
    } catch {
      setOutcome('refused');
    }
  };
  const words = outcome === 'copied' ? 'Copied' : children;
  return (
    <span style={{ display: 'inline-flex', alignItems: 'center', gap: 8 }}>
      <Button kind={kind} icon={Copy} label={label} onPress={() => void copy()}>
        {words}
      </Button>
      <span role="status" className={outcome === 'refused' ? undefined : 'sr-only'}>
        {outcome === 'copied' ? 'Copied' : null}
        {outcome === 'refused'
          ? 'This browser gives no clipboard here: mark the text and copy it by hand.'
          : null}
      </span>
    </span>
  );
}
