import { useEffect, useState } from 'react';

type Units = 'metric' | 'imperial';
type Terms = 'us' | 'uk';

/** A preference that the header may change while the island is on the page. */
function useAnnounced<Value extends string>(event: string, initial: Value): Value {
  const [value, setValue] = useState(initial);
  useEffect(() => {
    function take(announcement: Event) {
      // Says that the page need not be drawn again by the server.
      announcement.preventDefault();
      setValue((announcement as CustomEvent<Value>).detail);
    }
    document.addEventListener(event, take);
    return () => document.removeEventListener(event, take);
  }, [event]);
  return value;
}

export const useUnits = (initial: Units): Units => useAnnounced('ellwise:units', initial);
export const useTerms = (initial: Terms): Terms => useAnnounced('ellwise:terms', initial);
