import type { BlanketSummary } from '../../../schemas/blanket';

export const SORTINGS = [
  { value: 'changed', word: 'last change' },
  { value: 'title', word: 'title' },
  { value: 'size', word: 'size, largest first' },
  { value: 'skeins', word: 'skeins, most first' },
] as const;
export type Sorting = (typeof SORTINGS)[number]['value'];

const area = ({ figures }: BlanketSummary): number =>
  figures ? figures.widthMm * figures.heightMm : 0;

const compare: Record<Sorting, (left: BlanketSummary, right: BlanketSummary) => number> = {
  changed: (left, right) => right.updatedAt.localeCompare(left.updatedAt),
  title: (left, right) => left.title.localeCompare(right.title, 'en', { sensitivity: 'base' }),
  size: (left, right) => area(right) - area(left),
  skeins: (left, right) => (right.figures?.skeins ?? 0) - (left.figures?.skeins ?? 0),
};

export const sorted = (blankets: readonly BlanketSummary[], by: Sorting): BlanketSummary[] =>
  blankets.toSorted(compare[by]);

/** Those whose title, yarn or colours hold the searched text. */
export function matching(blankets: readonly BlanketSummary[], search: string): BlanketSummary[] {
  const wanted = search.trim().toLowerCase();
  return blankets.filter(({ title, yarnName, colours }) =>
    [title, yarnName, ...colours.map(({ name }) => name)].some((text) =>
      text.toLowerCase().includes(wanted),
    ),
  );
}

/** "Ida’s blanket, copy", then "Ida’s blanket, copy 2", until it is no other's. */
export function copyTitle(title: string, others: readonly { title: string }[]): string {
  const taken = new Set(others.map((other) => other.title));
  const base = title.replace(/, copy( \d+)?$/, '').slice(0, 100);
  for (let number = 1; ; number += 1) {
    const copy = number === 1 ? `${base}, copy` : `${base}, copy ${number}`;
    if (!taken.has(copy)) return copy;
  }
}
