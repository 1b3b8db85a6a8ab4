const HEADER = 'x-ellwise-client-address';

/**
 * Writes the caller's address where Auth.js can hand it on, which passes headers and nothing else.
 * Always written over, so that a caller cannot choose it.
 */
export function noteClientAddress(request: Request, address: string): void {
  request.headers.set(HEADER, address);
}

export function clientAddressOf(request: Request): string {
  return request.headers.get(HEADER) ?? 'unknown';
}
