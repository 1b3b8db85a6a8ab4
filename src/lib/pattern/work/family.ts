/**
 * What a pattern calls a stitch when it works into it: a FPdc is a dc, a dc3tog a cluster as dc3cl is,
 * any popcorn a popcorn.
 */
export function familyOf(code: string): string {
  if (/^(FP|BP|FL|BL)/.test(code)) return code.slice(2);
  if (/\d(tog|cl)$/.test(code)) return 'cluster';
  if (code.endsWith(' pc')) return 'popcorn';
  if (code.endsWith(' puff')) return 'puff';
  return code;
}

/** The plain stitch whose height a stitch has: "dc" of "FPdc", "dc3cl" and "5-dc pc". */
export function baseOf(code: string): string {
  const plain = /^(?:FP|BP|FL|BL)?(?:\d+-)?(e?sc|e?hdc|e?dc|e?tr|dtr|trtr)(?![a-z])/.exec(code);
  return plain?.[1] ?? code;
}
