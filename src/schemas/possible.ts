import { POSSIBLE } from './limits';

interface Issues {
  addIssue(issue: { code: 'custom'; path: (string | number)[]; message: string }): void;
}

/** A number that is none or below zero has had its own message by then. */
const isGiven = (value: number) => value > 0 && value < Infinity;
const round = (value: number) => Number(value.toPrecision(3));

/** A put-up must be of a yarn that could be spun. */
export function checkPutUp(putUp: { massG: number; lengthM: number }, issues: Issues): void {
  const perGram = putUp.lengthM / putUp.massG;
  const { least, most } = POSSIBLE.metresPerGram;
  if (!isGiven(perGram) || !isGiven(putUp.massG)) return;
  if (perGram >= least && perGram <= most) return;
  const message = `No yarn runs ${round(perGram)} m to the gram: check the length and the mass`;
  issues.addIssue({ code: 'custom', path: ['lengthM'], message });
}

/** A swatch's stitches and rows must be of a size that a hook can make. */
export function checkStitchSize(
  counts: { stitches: number; rows: number },
  size: { widthMm: number; heightMm: number },
  issues: Issues,
  path: (string | number)[] = [],
): void {
  const { least, most } = POSSIBLE.stitchSizeMm;
  const check = (field: string, what: string, eachMm: number, counted: string) => {
    if (!isGiven(eachMm) || (eachMm >= least && eachMm <= most)) return;
    const message = `${what} of ${round(eachMm)} mm cannot be: check the ${counted}`;
    issues.addIssue({ code: 'custom', path: [...path, field], message });
  };
  check('widthMm', 'Stitches', size.widthMm / counts.stitches, 'width and the stitches counted');
  check('heightMm', 'Rows', size.heightMm / counts.rows, 'height and the rows counted');
}
