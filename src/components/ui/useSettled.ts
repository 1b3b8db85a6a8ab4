import { useEffect, useState } from 'react';

/** A value once it has stayed the same for a while: what is read out when typing pauses. */
export function useSettled<Value>(value: Value, afterMs = 900): Value {
  const [settled, setSettled] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), afterMs);
    return () => clearTimeout(timer);
  }, [value, afterMs]);
  return settled;
}
