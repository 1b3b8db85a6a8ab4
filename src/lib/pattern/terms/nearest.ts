/**
 * The word of `known` that `word` is most likely a slip of: at most one letter wrong, missing, too
 * many or swapped with its neighbour, two in words of six letters or more. Null when none is near.
 *
 * Example: `nearest('dcc', ['sc', 'dc'])` is "dc".
 */
export function nearest(word: string, known: Iterable<string>): string | null {
  let best: string | null = null;
  let bestDistance = word.length >= 6 ? 3 : word.length >= 2 ? 2 : 0;
  for (const each of known) {
    if (Math.abs(each.length - word.length) >= bestDistance) continue;
    const distance =
      bestDistance === 2 ? oneEdit(word, each) : editDistance(word, each, bestDistance);
    if (distance < bestDistance) {
      best = each;
      bestDistance = distance;
    }
  }
  return best;
}

/** 0 for the same word, 1 where one letter is wrong, missing, too many or swapped with its neighbour, else 2. */
function oneEdit(left: string, right: string): number {
  let begin = 0;
  while (begin < left.length && left[begin] === right[begin]) begin += 1;
  let end = 0;
  const most = Math.min(left.length, right.length) - begin;
  while (end < most && left[left.length - 1 - end] === right[right.length - 1 - end]) end += 1;
  const leftOver = left.length - begin - end;
  const rightOver = right.length - begin - end;
  if (leftOver <= 1 && rightOver <= 1) return Math.max(leftOver, rightOver);
  const swapped = leftOver === 2 && rightOver === 2;
  return swapped && left[begin] === right[begin + 1] && left[begin + 1] === right[begin] ? 1 : 2;
}

/** Optimal string alignment distance, given up at `most`. */
function editDistance(left: string, right: string, most: number): number {
  let beforeLast: number[] = [];
  let last = Array.from({ length: right.length + 1 }, (_, j) => j);
  for (let i = 1; i <= left.length; i += 1) {
    const row = [i];
    let least = i;
    for (let j = 1; j <= right.length; j += 1) {
      const same = left[i - 1] === right[j - 1];
      let cost = Math.min(
        (last[j] ?? 0) + 1,
        (row[j - 1] ?? 0) + 1,
        (last[j - 1] ?? 0) + (same ? 0 : 1),
      );
      if (i > 1 && j > 1 && left[i - 1] === right[j - 2] && left[i - 2] === right[j - 1]) {
        cost = Math.min(cost, (beforeLast[j - 2] ?? 0) + 1);
      }
      row.push(cost);
      least = Math.min(least, cost);
    }
    if (least >= most) return most;
    beforeLast = last;
    last = row;
  }
  return last[right.length] ?? most;
}
