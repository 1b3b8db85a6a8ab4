import { countedColumn, jsonColumn, textColumn } from './columns';

/** Columns of a motif's pattern and of what it was worked to, now and in every save. */
export const patternColumns = () => ({
  name: textColumn(),
  text: textColumn(),
  terms: textColumn(),
  sides: countedColumn(),
  size: countedColumn(),
  stitches: jsonColumn(),
  ring: jsonColumn(),
  rounds: jsonColumn(),
  errors: countedColumn(),
  warnings: countedColumn(),
});
