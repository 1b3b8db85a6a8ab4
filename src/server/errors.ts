/** Every code an answer may carry, and the HTTP status it travels with. */
export const STATUS_OF_CODE = {
  invalid: 400,
  malformed: 400,
  unauthenticated: 401,
  forbidden: 403,
  'foreign-origin': 403,
  'not-found': 404,
  'not-allowed': 405,
  conflict: 409,
  'in-use': 409,
  'last-administrator': 409,
  gone: 410,
  'too-large': 413,
  unsupported: 415,
  'too-many': 429,
  internal: 500,
} as const satisfies Record<string, number>;

export type ErrorCode = keyof typeof STATUS_OF_CODE;

interface AppErrorDetail {
  /** Message per field path, as the form shows it. */
  fields?: Record<string, string>;
  /** The row as it is now, presented: what a conflicting save must be compared with. */
  current?: unknown;
  /** Seconds until the call may be made again. */
  retryAfterS?: number;
}

/** A failure that the caller is told about; anything else becomes `internal` without detail. */
export class AppError extends Error {
  readonly code: ErrorCode;
  readonly fields?: Record<string, string>;
  readonly current?: unknown;
  readonly retryAfterS?: number;

  constructor(code: ErrorCode, message: string, detail: AppErrorDetail = {}) {
    super(message);
    this.name = 'AppError';
    this.code = code;
    Object.assign(this, detail);
  }
}
