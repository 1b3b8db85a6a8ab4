import type { RepeatStep, StandsFor, Step, Times } from '../syntax';
import { printAmount, printFilter, printUntil, printWheres } from './printPlace';
import type { Vocabulary } from './vocabulary';

/** Steps one after another, separated as patterns do: the join after a semicolon. */
export function printSteps(steps: readonly Step[], words: Vocabulary): string {
  return steps
    .map((step, i) => (i === 0 ? '' : step.kind === 'join' ? '; ' : ', ') + printStep(step, words))
    .join('');
}

function printStep(step: Step, words: Vocabulary): string {
  switch (step.kind) {
    case 'stitch': {
      const many =
        step.amount.value !== 1 || step.amount.sizes ? `${printAmount(step.amount)} ` : '';
      const standing = step.standing ? 'standing ' : '';
      return withPlace(
        `${standing}${many}${words.stitch(step.code)}`,
        printWheres(step.where, words),
      );
    }
    case 'chain':
      return `${words.chain()} ${printAmount(step.amount)}${printStandsFor(step.standsFor, words)}`;
    case 'skip': {
      const one = step.amount.value === 1 && !step.amount.sizes;
      const many = one ? '' : `${printAmount(step.amount)} `;
      return `${words.skip()} next ${many}${printFilter(step.filter, words, !one)}`;
    }
    case 'group': {
      const times =
        step.times.value !== 1 || step.times.sizes ? ` ${printAmount(step.times)} times` : '';
      return withPlace(
        `(${printSteps(step.parts, words)})${times}`,
        printWheres(step.where, words),
      );
    }
    case 'repeat':
      return step.mark === 'star'
        ? printStar(step, words)
        : `[${printSteps(step.parts, words)}] ${printTimes(step.times, words)}`;
    case 'join':
      return `join with ${words.stitch(step.code)}${printTarget(step.to, words)}`;
    case 'attach': {
      const yarn = step.colour ?? 'yarn';
      const stitch = step.code === null ? '' : ` with ${words.stitch(step.code)}`;
      return withPlace(`join ${yarn}${stitch}`, printWheres(step.where, words));
    }
    case 'colour':
      return `with ${step.colour}`;
    case 'magic-ring':
      return 'magic ring';
    case 'turn':
      return 'turn';
    case 'fasten-off':
      return 'fasten off';
  }
}

const withPlace = (what: string, where: string): string =>
  where === '' ? what : `${what} ${where}`;

export function printStandsFor(standsFor: StandsFor | null, words: Vocabulary): string {
  if (standsFor === null) return '';
  if (standsFor.code === null) return ` (does not count as a ${words.word('st')})`;
  const space =
    standsFor.chains > 0 ? ` and ${words.chain()}-${standsFor.chains} ${words.word('sp')}` : '';
  return ` (counts as ${words.stitch(standsFor.code)}${space})`;
}

const printTimes = (times: Times, words: Vocabulary): string =>
  times.kind === 'count' ? `${printAmount(times.amount)} times` : printUntil(times.until, words);

function printStar(step: RepeatStep, words: Vocabulary): string {
  const { parts, partsBeforeEnd: mark, times } = step;
  const body =
    mark === null
      ? printSteps(parts, words)
      : [printSteps(parts.slice(0, mark), words) + '**', printSteps(parts.slice(mark), words)]
          .filter((part) => part !== '')
          .join(', ');
  const rep = `${words.word('rep')} from *`;
  const more =
    times.kind === 'count'
      ? `${printMore(times.amount)} more times`
      : printUntil(times.until, words);
  const ending = mark === null ? '' : `, ending last ${words.word('rep')} at **`;
  return `*${body}; ${rep} ${more}${ending}`;
}

const printMore = ({ value, sizes }: { value: number; sizes: readonly number[] | null }): string =>
  printAmount({ value: value - 1, sizes: sizes?.map((each) => each - 1) ?? null });

function printTarget(to: 'ring' | 'turning-chain' | 'first' | 'unsaid', words: Vocabulary): string {
  if (to === 'ring') return ' to form ring';
  if (to === 'first') return ` in first ${words.word('st')}`;
  return to === 'unsaid' ? '' : ` in top of ${words.word('beg')} ${words.chain()}`;
}
