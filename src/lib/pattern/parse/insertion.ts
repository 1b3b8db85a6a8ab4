import type { ParseState } from './parseState';

/** "BLO of", "back loops only of": sets where the hook goes in for the stitch that is being read. */
export function readLoops(state: ParseState): void {
  const start = state.at;
  state.skipFillers();
  const short = /^(blo?|flo?)$/.exec(state.peek().text)?.[1];
  const long = state.isWord('back') || state.isWord('front');
  if (!short && !(long && /^(loop|loops|lp|lps)$/.test(state.peek(1).text))) {
    state.at = start;
    return;
  }
  state.insertionHere = (short ?? state.peek().text).startsWith('b') ? 'BL' : 'FL';
  state.at += short ? 1 : 2;
  if (state.isWord('only')) state.at += 1;
  if (state.take('of')) state.skipFillers();
}

/** "around post of": says nothing that "FPdc" does not. */
export function takePost(state: ParseState): void {
  const start = state.at;
  state.skipFillers();
  if (!state.isWord('post') && !state.isWord('posts')) {
    state.at = start;
    return;
  }
  state.at += 1;
  state.take('of');
  state.skipFillers();
}

/** "sc in each st around in back loops only": said after the places, it is said of them. */
export function readLoopsAfter(state: ParseState): void {
  const start = state.at;
  const before = state.insertionHere;
  if (state.take('in')) {
    readLoops(state);
    if (state.insertionHere !== before) return;
  }
  state.at = start;
}

/** "sc tbl in next sc": through the back loop. */
export function takeThroughBackLoop(state: ParseState): void {
  if (!state.isWord('tbl')) return;
  state.insertionHere = 'BL';
  state.at += 1;
}
