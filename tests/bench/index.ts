import { benchCalibration } from './calibration.ts';
import { benchCompareTime } from './compareTime.ts';
import { benchEstimateTime } from './estimateTime.ts';
import { benchLayoutTime } from './layoutTime.ts';
import { benchPainting } from './painting.ts';
import { benchPatternTime } from './patternTime.ts';
import { benchPages } from './pages.ts';
import { heading } from './report.ts';
import { benchRequests } from './requests.ts';
import { benchTyping } from './typing.ts';

/** `npm run bench`, or `npm run bench -- time pages` for some parts; BASE_URL is the built site. */
const parts = {
  time: benchEstimateTime,
  compare: benchCompareTime,
  layout: benchLayoutTime,
  pattern: benchPatternTime,
  typing: withSite(benchTyping),
  painting: withSite(benchPainting),
  calibration: benchCalibration,
  requests: withSite(benchRequests),
  pages: withSite(benchPages),
};

function withSite(bench: (baseUrl: string) => Promise<void>): () => Promise<void> {
  return async () => {
    const { BASE_URL } = process.env;
    if (BASE_URL) await bench(BASE_URL);
    else heading(`${bench.name}: skipped, BASE_URL names no site`);
  };
}

const asked = process.argv.slice(2);
const unknown = asked.find((name) => !(name in parts));
if (unknown) throw new Error(`"${unknown}" is not one of: ${Object.keys(parts).join(', ')}`);
for (const [name, bench] of Object.entries(parts)) {
  if (asked.length === 0 || asked.includes(name)) await bench();
}
