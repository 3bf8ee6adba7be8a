import { defineConfig, passthroughImageService } from 'astro/config';
import node from '@astrojs/node';
import react from '@astrojs/react';
import auth from 'auth-astro';
import tailwindcss from '@tailwindcss/vite';

/** The address that people use; behind a proxy it is not this machine's. Set it for the build too. */
const publicUrl = new URL(process.env.PUBLIC_URL || 'http://127.0.0.1:4321');

export default defineConfig({
  output: 'server',
  site: publicUrl.origin,
  server: { host: '127.0.0.1' },
  adapter: node({ mode: 'middleware' }),
  integrations: [react(), auth({ configFile: './src/auth/config.ts' })],
  image: { service: passthroughImageService() },
  security: {
    checkOrigin: true,
    // A host that is not here becomes a bare "localhost", and then every form post counts as another site's.
    allowedDomains: [...new Set(['127.0.0.1', 'localhost', publicUrl.hostname])].map((hostname) => ({ hostname })),
  },
  experimental: {
    csp: {
      directives: [
        "default-src 'self'",
        "img-src 'self' data: blob:",
        "font-src 'self'",
        "connect-src 'self'",
        "object-src 'none'",
        "base-uri 'none'",
        "form-action 'self'",
        "frame-ancestors 'none'",
      ],
    },
  },
  devToolbar: { enabled: false },
  prefetch: false,
  vite: {
    plugins: [tailwindcss()],
    ssr: { noExternal: ['zod'] },
    build: { sourcemap: false },
  },
});
