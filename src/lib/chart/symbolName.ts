/**
 * Japanese names of chart symbols, as JIS L 0201 has them (published: standard's Table 2, names as
 * reference works print them); stitches without one there have none here.
 */
const JIS_NAMES: Readonly<Record<string, string>> = {
  ch: 'くさり編み',
  'sl st': '引き抜き編み',
  sc: 'こま編み',
  hdc: '中長編み',
  dc: '長編み',
  tr: '長々編み',
  dtr: '三つ巻き長編み',
};

/** The name of a stitch's symbol in JIS L 0201, or null. */
export const jisName = (code: string): string | null =>
  Object.hasOwn(JIS_NAMES, code) ? (JIS_NAMES[code] as string) : null;
