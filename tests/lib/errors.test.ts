import { describe, expect, it } from 'vitest';
import { DomainError } from '../../src/lib/errors';

describe('DomainError', () => {
  it('is an error with a name and a code', () => {
    const error = new DomainError('grid-out-of-range', 'gridCounts requires more');
    expect(error).toBeInstanceOf(Error);
    expect(error).toMatchObject({
      name: 'DomainError',
      code: 'grid-out-of-range',
      message: 'gridCounts requires more',
    });
  });
});
