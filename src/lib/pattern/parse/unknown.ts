import type { Step } from '../syntax';
import { isKnown, nearestKnown } from './comment';
import type { ParseState } from './parseState';

/**
 * What no rule reads. A word that is one letter away from a known one is told, with the known one, and
 * left out; a number or an abbreviation that nobody knows is told; plain words are stepped over.
 */
export function readUnknown(state: ParseState): Step[] {
  const first = state.at;
  const afterNumber = state.last().kind === 'number' && state.at > 0;
  const token = state.peek();
  const looksWorked = afterNumber || followedByPlace(state);
  if (token.kind === 'word' && !isKnown(state, state.at)) {
    const near = nearestKnown(state, token.text);
    if (near !== null && (looksWorked || token.text.length <= 6)) {
      state.error(
        'unknown-word',
        token,
        `"${token.written}" is not an abbreviation. Is "${near}" meant?`,
        {
          label: `Write "${near}"`,
          begin: token.begin,
          end: token.end,
          replacement: near,
        },
      );
    } else if (looksWorked) {
      state.error(
        'unknown-word',
        token,
        `"${token.written}" is not an abbreviation this reader knows.`,
      );
    } else {
      state.report.say(
        'note',
        'not-understood',
        skipped(state, first),
        'These words are read as a remark and not worked.',
      );
      return [];
    }
  } else if (token.kind !== 'word' && !/^(line|mark|end)$/.test(token.kind)) {
    state.error('not-understood', token, `It is not clear what "${token.written}" means here.`);
  } else if (afterNumber) {
    state.error(
      'not-understood',
      state.last(),
      `"${state.last().written}" of what? A stitch is missing after the number.`,
    );
  } else if (token.kind === 'word') {
    state.report.say(
      'warning',
      'not-understood',
      token,
      `It is not clear what "${token.written}" means here.`,
    );
  }
  skipped(state, first);
  return [];
}

/** "… in next st", "… around": what stands here was meant to be a stitch. */
const followedByPlace = (state: ParseState): boolean =>
  (state.means('in', 1) || state.means('each', 1) || state.means('next', 1)) &&
  state.peek().text.length <= 8;

/** Steps over the rest of the clause. */
function skipped(state: ParseState, first: number): { begin: number; end: number } {
  while (!/^(mark|line|end)$/.test(state.peek().kind)) state.at += 1;
  if (state.at === first && state.peek().kind === 'mark' && !/^[()[\]{}*]/.test(state.peek().text))
    state.at += 1;
  return state.spanFrom(first);
}
