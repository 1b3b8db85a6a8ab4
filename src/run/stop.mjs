import { stopCluster } from './postgres.mjs';
import { NAMES, endRunning } from './running.mjs';
import { runMain, say } from './say.mjs';

/** `npm stop`: the site, the development server and the private database, whatever runs. */
async function stop() {
  let stopped = false;
  for (const name of NAMES) stopped = (await endRunning(name)) || stopped;
  stopped = (await stopCluster()) || stopped;
  say(stopped ? 'Ellwise is stopped.' : 'Ellwise was not running.');
}

await runMain(stop);
