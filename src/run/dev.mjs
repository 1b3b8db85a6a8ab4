import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { withLock } from './lock.mjs';
import { root } from './paths.mjs';
import { LOOPBACK } from './ports.mjs';
import { openResources } from './resources.mjs';
import { findRunning, noteRunning } from './running.mjs';
import { runMain, say } from './say.mjs';
import { choosePort, loadDatabase, openMail, openServices, sessionEnvironment } from './site.mjs';

/** `npm run dev`: database, mail and demo data, then Astro's development server. */
async function dev() {
  const resources = openResources({ interruptedCode: 0 });
  try {
    const child = await withLock('dev', () => launch(resources));
    if (!child) return 0;
    const [code] = child.exitCode === null ? await once(child, 'exit') : [child.exitCode];
    return code ?? 1;
  } finally {
    await resources.close();
  }
}

/** @param {import('./resources.mjs').Resources} resources */
async function launch(resources) {
  const running = findRunning('dev');
  if (running) {
    say(`The development server is already running at ${running.url}`);
    return undefined;
  }
  const database = await openServices(resources);
  await loadDatabase(database);
  const mail = await openMail(resources);
  const port = await choosePort();
  const child = spawn(
    process.execPath,
    ['node_modules/astro/astro.js', 'dev', '--host', LOOPBACK, '--port', String(port)],
    {
      cwd: root,
      stdio: ['ignore', 'inherit', 'inherit'],
      env: {
        ...process.env,
        ASTRO_TELEMETRY_DISABLED: '1',
        ASTRO_DISABLE_UPDATE_CHECK: 'true',
        DATABASE_URL: database.url,
        ...sessionEnvironment(),
        ...mail,
      },
    },
  );
  resources.add(async () => {
    if (child.exitCode !== null || child.signalCode !== null) return;
    child.kill('SIGTERM');
    await once(child, 'exit');
  });
  const url = `http://${LOOPBACK}:${port}`;
  resources.add(noteRunning('dev', { childPid: child.pid, url }));
  return child;
}

await runMain(dev);
