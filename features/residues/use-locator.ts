import { useCombobox } from 'downshift';
import { useCallback, useEffect, useState } from 'react';
import type { Reading } from '@/shared/contracts/residues';
import { onlyReading } from './group-readings';
import { useLocate } from './use-residues';

const none: Reading[] = [];
const types = useCombobox.stateChangeTypes;

export interface LocatorOptions {
  projectId: string;
  onOpen: (reading: Reading) => void;
  initialText?: string;
  /** The list is open at once: its text was typed before. */
  startsOpen?: boolean;
  /** The list belongs to the page and is never closed. */
  stays?: boolean;
  /** Opens the only reading without waiting for Enter: a link said this address. */
  opensOnly?: boolean;
}

/**
 * The box that reads addresses. Nothing is chosen before Enter on a highlighted row, neither by leaving the box nor by
 * passing over a row. Enter without one opens the only reading, or asks to choose.
 */
export function useLocator(options: LocatorOptions) {
  const { projectId, onOpen, initialText = '', startsOpen = false, stays, opensOnly } = options;
  const [text, setText] = useState(initialText);
  /** The text that Enter was pressed on, while its readings may still be under way. */
  const [asked, setAsked] = useState<string | null>(opensOnly ? initialText : null);
  const found = useLocate(projectId, text);
  const readings = found.data?.readings ?? none;
  const isFresh = found.data !== undefined && !found.isBehind;

  const open = useCallback(
    (reading: Reading) => {
      setAsked(null);
      if (!stays) setText('');
      // The page takes over: its keys would be letters in the box.
      if (document.activeElement instanceof HTMLElement) document.activeElement.blur();
      onOpen(reading);
    },
    [onOpen, stays],
  );
  const box = useCombobox<Reading>({
    items: readings,
    inputValue: text,
    selectedItem: null,
    defaultHighlightedIndex: -1,
    initialIsOpen: startsOpen,
    ...(stays ? { isOpen: true } : null),
    itemToString: () => text,
    isItemDisabled: () => !isFresh,
    stateReducer: (state, { type, changes }) => {
      if (type === types.InputBlur) return { ...changes, selectedItem: null, inputValue: state.inputValue };
      if (type === types.MenuMouseLeave) return { ...changes, highlightedIndex: state.highlightedIndex };
      return changes;
    },
    onSelectedItemChange: ({ selectedItem }) => {
      if (selectedItem) open(selectedItem);
    },
    onInputValueChange: ({ type }) => {
      // The first Esc closes the list, the second empties the box.
      if (type === types.InputKeyDownEscape) setText('');
    },
  });

  // Other readings under the same highlight would be another choice.
  const { setHighlightedIndex, closeMenu } = box;
  useEffect(() => setHighlightedIndex(-1), [readings, setHighlightedIndex]);

  const only = found.data ? onlyReading(found.data) : null;
  const isAnswered = asked !== null && asked === text && isFresh;
  useEffect(() => {
    if (!isAnswered || !only) return;
    closeMenu();
    open(only);
  }, [isAnswered, only, open, closeMenu]);

  const write = (next: string) => {
    setText(next);
    setAsked(null);
  };
  return {
    box,
    text,
    write,
    /** Enter without a highlighted row. */
    ask: () => setAsked(text),
    open,
    found: found.data,
    error: found.error,
    isFresh,
    isReading: text.trim() !== '' && !isFresh && !found.error,
    asksToChoose: isAnswered && only === null && readings.length > 0,
    highlighted: readings[box.highlightedIndex] ?? null,
  };
}

export type Locator = ReturnType<typeof useLocator>;
