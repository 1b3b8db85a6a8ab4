import { defineConfig } from 'astro/config';
import node from '@astrojs/node';
import react from '@astrojs/react';
import tailwindcss from '@tailwindcss/vite';
import auth from 'auth-astro';

export default defineConfig({
  output: 'server',
  adapter: node({ mode: 'standalone' }),
  integrations: [react(), auth({ configFile: './src/server/auth.config.ts' })],
  // Host and protocol are pinned by src/server/entry.mjs before a request reaches Astro.
  security: { checkOrigin: true, allowedDomains: [{}] },
  // Names each page's own scripts by hash; src/server/entry completes the policy.
  experimental: { csp: true },
  session: { driver: 'memory' },
  devToolbar: { enabled: false },
  vite: {
    plugins: [tailwindcss()],
    // Scripts stay files: cached, and allowed by the policy without a hash.
    build: { assetsInlineLimit: 0 },
    // Astro bundles a zod 3 of its own; ours is 4 and must be built in.
    ssr: { noExternal: ['zod'] },
    server: { watch: { ignored: ['**/.ellwise/**'] } },
  },
});
