import { ownWordOf } from '../terms/ownWord';
import type { StitchTerm } from '../terms/readStitch';
import type { ParseState } from './parseState';

/** A stitch of the other set of terms is read as what it is, and told. */
export function tellForeign(state: ParseState, term: StitchTerm): void {
  if (term.foreign === null) return;
  const token = state.tokens[term.foreign];
  if (!token) return;
  const { terms } = state.lexicon;
  const [here, there] = terms === 'us' ? ['US', 'UK'] : ['UK', 'US'];
  const own = ownWordOf(token.written, terms);
  state.report.say(
    'warning',
    'terms-doubtful',
    token,
    `"${token.written}" is a ${there} term and the pattern is read in ${here} terms: is it written in ${there} terms?`,
    own === null
      ? undefined
      : { label: `Write "${own}"`, begin: token.begin, end: token.end, replacement: own },
  );
}
