/**
 * Puts text in place of a stretch of the field, as if it had been typed: the browser's own undo takes
 * it back. `insertText` is the only way a browser offers for that; where it has none, the text is set.
 */
export function editText(
  field: HTMLTextAreaElement,
  begin: number,
  end: number,
  replacement: string,
): void {
  field.focus();
  field.setSelectionRange(begin, end);
  const typed =
    typeof document.execCommand === 'function' &&
    document.execCommand(replacement === '' ? 'delete' : 'insertText', false, replacement);
  if (typed) return;
  field.setRangeText(replacement, begin, end, 'end');
  field.dispatchEvent(new Event('input', { bubbles: true }));
}
