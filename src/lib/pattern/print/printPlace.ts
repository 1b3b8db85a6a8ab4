import type { Amount, PlaceFilter, Until, Where } from '../syntax';
import type { Vocabulary } from './vocabulary';

/** "10 (12, 14)". */
export function printAmount({ value, sizes }: Amount): string {
  if (!sizes) return String(value);
  const [first, ...others] = sizes;
  return `${first} (${others.join(', ')})`;
}

/** "dc", "sts", "ch-2 sp", "corner". */
export function printFilter(
  { of, code, chains }: PlaceFilter,
  words: Vocabulary,
  many = false,
): string {
  const stitches = words.word(many ? 'sts' : 'st');
  const spaces = (): string => words.word(many ? 'sps' : 'sp');
  switch (of) {
    case 'stitch':
      return code === null ? stitches : words.stitch(code);
    case 'stitch-or-space':
      return `${stitches} and ${spaces()}`;
    case 'gap':
      return `${spaces()} between ${code === null ? words.word('sts') : words.stitch(code)}`;
    case 'gap-of-groups':
      return `${spaces()} between groups`;
    case 'corner':
      return many ? 'corners' : 'corner';
    case 'corner-space':
      return chains === null
        ? `corner ${spaces()}`
        : `${words.chain()}-${chains} corner ${spaces()}`;
    case 'space':
      return chains === null
        ? `${words.chain()}-${spaces()}`
        : `${words.chain()}-${chains} ${spaces()}`;
  }
}

/** "around", "to corner", "to next ch-2 sp", "to last 2 sts". */
export function printUntil(until: Until, words: Vocabulary): string {
  if (until.to === 'end') return until.word;
  if (until.to === 'corner') return 'to corner';
  if (until.to === 'space') return `to next ${printFilter(until.filter, words)}`;
  const corner = until.before === 'corner' ? ' before corner' : '';
  return `to last ${printAmount(until.amount)} ${words.word('sts')}${corner}`;
}

/** "in next 2 sts and in next ch-2 sp". */
export const printWheres = (wheres: readonly Where[], words: Vocabulary): string =>
  wheres.map((where) => printWhere(where, words)).join(' and ');

function printWhere(where: Where, words: Vocabulary): string {
  switch (where.kind) {
    case 'next':
    case 'last': {
      const { amount, filter, kind } = where;
      if (amount.value === 1 && !amount.sizes) return `in ${kind} ${printFilter(filter, words)}`;
      return `in each of ${kind} ${printAmount(amount)} ${printFilter(filter, words, true)}`;
    }
    case 'each':
      return `in each ${printFilter(where.filter, words)} ${printUntil(where.until, words)}`;
    case 'same':
      return 'in same place';
    case 'first':
    case 'any':
      return `in ${where.kind} ${printFilter(where.filter, words)}`;
    case 'ring':
      return where.magic ? 'in magic ring' : 'in ring';
    case 'facing':
      return `in facing ${printFilter(where.filter, words)}`;
    case 'turning-chain':
      return `in top of ${words.word('beg')} ${words.chain()}`;
    case 'chain-from-hook':
      return `in ${ordinal(where.nth)} ${words.chain()} from hook`;
  }
}

function ordinal(n: number): string {
  const teen = n % 100 >= 11 && n % 100 <= 13;
  return `${n}${teen ? 'th' : (['th', 'st', 'nd', 'rd'][n % 10] ?? 'th')}`;
}
