import { JOIN_TEXTS, type JoinText } from '../../lib/joins/joinTexts';
import { convertTerms } from '../../lib/pattern';

/** A join written out in both terms: the page shows those that the person reads. */
type WrittenJoin = Readonly<Record<'us' | 'uk', JoinText>>;

/** The texts of the ready-made joins, by their keys. */
export function writtenJoins(): Record<string, WrittenJoin> {
  const inUk = (text: string): string => convertTerms(text, 'us', 'uk');
  return Object.fromEntries(
    Object.entries(JOIN_TEXTS).map(([key, us]) => [
      key,
      { us, uk: { ...us, text: inUk(us.text), linked: us.linked && inUk(us.linked) } },
    ]),
  );
}
