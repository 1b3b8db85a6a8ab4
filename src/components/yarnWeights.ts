import { YARN_CATEGORIES } from '../lib/yarnCategories';
import { codeWord, type Terms } from './planner/stitchWord';
import type { SelectOption } from './ui/Select';

/** Yarn weights to choose from, each with its published gauge: "4 Medium · 11–14 sc in 4 in". */
export const weightOptions = (terms: Terms): SelectOption[] =>
  YARN_CATEGORIES.map(({ category, name, stitchesIn4In: [fewest, most] }) => ({
    value: String(category),
    word: `${category} ${name} · ${fewest}–${most} ${codeWord(category === 0 ? 'dc' : 'sc', terms)} in 4 in`,
  }));
