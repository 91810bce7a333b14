import { useEffect, useState } from 'react';

/** The value once it has stayed the same for a while: nobody is told of a fault in the middle of a word. */
export function useSettled<Value>(value: Value, milliseconds = 500): Value {
  const [settled, setSettled] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), milliseconds);
    return () => clearTimeout(timer);
  }, [value, milliseconds]);
  return settled;
}
