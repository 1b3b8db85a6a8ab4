import { openResources } from './resources.mjs';
import { runMain } from './say.mjs';
import { runTypeScript } from './scripts.mjs';
import { openDisposableSite, openServices } from './site.mjs';

/** `npm run bench`: tests/bench/index.ts against a built site of its own, at BASE_URL. */
async function bench() {
  const resources = openResources();
  try {
    const server = await openServices(resources);
    const { url, env } = await openDisposableSite(resources, server, 'bench');
    await runTypeScript('tests/bench/index.ts', {
      args: process.argv.slice(2),
      env: { ...env, BASE_URL: url },
      show: true,
    });
  } finally {
    await resources.close();
  }
}

await runMain(bench);
