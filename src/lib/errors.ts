/**
 * The only thing `lib` throws: a value that is outside the domain of a function.
 * `code` is for programs, `message` names the function, the value and the range.
 */
export class DomainError extends Error {
  readonly code: string;

  constructor(code: string, message: string) {
    super(message);
    this.name = 'DomainError';
    this.code = code;
  }
}
