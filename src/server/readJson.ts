import { AppError } from './errors';

const BODY_MAX_BYTES = 256 * 1024;

/** U+0000 as JSON must write it, which PostgreSQL's text cannot hold: an odd backslash and u0000. */
const ESCAPED_NUL = /(?<!\\)(?:\\\\)*\\u0000/;

/** The request's JSON, counted while it is read: a false content-length gains nothing. */
export async function readJson(request: Request): Promise<unknown> {
  const type = request.headers.get('content-type')?.split(';')[0]?.trim().toLowerCase();
  if (type !== 'application/json') {
    throw new AppError('unsupported', 'Send the body as application/json.');
  }
  const text = await readText(request);
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    throw new AppError('malformed', 'The body is not valid JSON.');
  }
  if (ESCAPED_NUL.test(text)) {
    throw new AppError('invalid', 'Text may not contain the character U+0000.');
  }
  return value;
}

/** The body as UTF-8 text of at most 256 KiB. */
export async function readText(request: Request): Promise<string> {
  const tooLarge = new AppError('too-large', 'The body may hold at most 256 KiB.');
  if (Number(request.headers.get('content-length')) > BODY_MAX_BYTES) throw tooLarge;
  if (!request.body) return '';

  const decoder = new TextDecoder('utf-8', { fatal: true });
  let byteCount = 0;
  let text = '';
  const reader = request.body.getReader();
  try {
    for (;;) {
      const { done, value } = await reader.read();
      if (done) return text + decoder.decode();
      byteCount += value.byteLength;
      if (byteCount > BODY_MAX_BYTES) {
        await reader.cancel();
        throw tooLarge;
      }
      text += decoder.decode(value, { stream: true });
    }
  } catch (error) {
    if (error instanceof TypeError) throw new AppError('malformed', 'The body is not valid UTF-8.');
    throw error;
  }
}
