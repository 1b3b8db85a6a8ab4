import { memo } from 'react';
import { jisName } from '../../lib/chart/symbolName';
import { sampleSymbol } from '../../lib/chart/sampleSymbol';
import { symbolPath } from '../../lib/chart/symbolPath';
import { ownStitchCode, type OwnStitch } from '../../lib/stitches/ownStitch';
import { SIZES } from '../../lib/chart/sizes';
import { stitch } from '../../lib/stitches/stitchTable';
import { codeWord, type Terms } from '../planner/stitchWord';

interface ChartKeyProps {
  codes: readonly string[];
  terms: Terms;
  ownStitches?: readonly OwnStitch[];
}

/** The symbols that a chart uses, each with its abbreviation and name. */
export const ChartKey = memo(({ codes, terms, ownStitches }: ChartKeyProps) => {
  return (
    <ul aria-label="Symbols of this chart" className="flex flex-wrap gap-x-7 gap-y-2">
      {codes.map((code) => {
        const own = ownStitches?.find((each) => ownStitchCode(each) === code);
        const sample = sampleSymbol(code, own);
        const { line, solid } = symbolPath(sample);
        const middle = Math.min(-0.45, sample.head[1] / 2);
        const found = stitch(code);
        const name = own?.name ?? (terms === 'us' ? found?.us : found?.uk);
        const jis = jisName(code);
        return (
          <li
            key={code}
            className="flex items-center gap-2"
            title={jis ? `JIS L 0201: ${jis}` : undefined}
          >
            <svg
              viewBox={`-1 ${middle - 1.4} 2 2.8`}
              className="h-10 w-7 shrink-0 text-ink"
              aria-hidden
            >
              <path
                d={line}
                fill="none"
                stroke="currentColor"
                strokeWidth={SIZES.line * 1.3}
                strokeLinecap="round"
              />
              <path d={solid} fill="currentColor" />
            </svg>
            <span>
              <b className="font-mono">{codeWord(code, terms)}</b>{' '}
              <span className="text-ink-2">{name}</span>
              {jis && (
                <span className="sr-only">
                  , in Japanese <span lang="ja">{jis}</span>
                </span>
              )}
            </span>
          </li>
        );
      })}
    </ul>
  );
});
ChartKey.displayName = 'ChartKey';
