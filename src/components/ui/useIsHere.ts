import { useEffect, useState } from 'react';

/**
 * Whether the page is in the browser yet. What is fetched later waits for it: streamed by the server
 * it would need inline scripts, which the content policy refuses.
 */
export function useIsHere(): boolean {
  const [isHere, setIsHere] = useState(false);
  useEffect(() => setIsHere(true), []);
  return isHere;
}
