/** Prints what is marked as a sheet (`data-sheet`), and nothing of the page around it. */
export function printSheet(): void {
  const { dataset } = document.documentElement;
  dataset.printing = 'sheet';
  window.addEventListener('afterprint', () => delete dataset.printing, { once: true });
  window.print();
}
