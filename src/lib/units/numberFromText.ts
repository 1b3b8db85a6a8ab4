/** A number that was typed, or what is wrong with it in words. */
export type TypedNumber =
  { readonly ok: true; readonly value: number } | { readonly ok: false; readonly error: string };

const TYPED_NUMBER = /^[+-]?(\d+([.,]\d*)?|[.,]\d+)$/;
const GROUPED = /^[+-]?[1-9]\d{0,2},\d{3}$/;

/**
 * What a person types in a number field. Empty is missing, never 0; a decimal comma is read as a
 * point, except where "1,500" could as well mean fifteen hundred.
 *
 * Example: `numberFromText('12,5')` is `{ ok: true, value: 12.5 }`.
 */
export function numberFromText(text: string): TypedNumber {
  const typed = text.trim();
  if (typed === '') return { ok: false, error: 'Write a number' };
  if (GROUPED.test(typed)) {
    const error = `Write ${typed.replace(',', '')} or ${typed.replace(',', '.')}: the comma could mean either`;
    return { ok: false, error };
  }
  if (!TYPED_NUMBER.test(typed)) return { ok: false, error: 'Write a number, such as 12.5' };
  return { ok: true, value: Number(typed.replace(',', '.')) };
}
