import { defineConfig, passthroughImageService } from 'astro/config';
import node from '@astrojs/node';
import react from '@astrojs/react';
import auth from 'auth-astro';
import tailwindcss from '@tailwindcss/vite';

export default defineConfig({
  output: 'server',
  site: 'http://127.0.0.1:4321',
  adapter: node({ mode: 'middleware' }),
  integrations: [react(), auth({ configFile: './src/auth/config.ts' })],
  image: { service: passthroughImageService() },
  security: {
    checkOrigin: true,
    allowedDomains: [{ hostname: '127.0.0.1' }, { hostname: 'localhost' }],
  },
  experimental: { csp: true },
  devToolbar: { enabled: false },
  prefetch: false,
  vite: {
    plugins: [tailwindcss()],
    ssr: { noExternal: ['zod'] },
    build: { sourcemap: false },
  },
});
