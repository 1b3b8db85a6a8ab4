import { format } from 'node:util';

const original = console.error;
let printed: string[] = [];
let expected: RegExp[] = [];

console.error = (...args: unknown[]) => {
  const message = format(...args);
  printed.push(message);
  if (!expected.some((pattern) => pattern.test(message))) original(...args);
};

/** Lets this test print errors that match; any other console.error fails it. */
export function expectConsoleError(pattern: RegExp): void {
  expected.push(pattern);
}

export function forgetConsoleErrors(): void {
  printed = [];
  expected = [];
}

export function unexpectedConsoleErrors(): string[] {
  return printed.filter((message) => !expected.some((pattern) => pattern.test(message)));
}
