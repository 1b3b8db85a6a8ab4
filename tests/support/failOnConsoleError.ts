import { afterEach, beforeEach } from 'vitest';
import { forgetConsoleErrors, unexpectedConsoleErrors } from './consoleErrors.ts';

beforeEach(forgetConsoleErrors);

afterEach(() => {
  const messages = unexpectedConsoleErrors();
  if (messages.length > 0) throw new Error(`Unexpected console.error:\n${messages.join('\n')}`);
});
