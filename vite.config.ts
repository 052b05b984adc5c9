import { cpSync } from 'node:fs'
import { resolve } from 'node:path'
import tailwindcss from '@tailwindcss/vite'
import react from '@vitejs/plugin-react'
import { defineConfig, type Plugin } from 'vite'

const apiOrigin = process.env.API_ORIGIN ?? 'http://127.0.0.1:4001'
const proxied = ['/api', '/health', '/ready', '/preferences', '/oembed', '/mailroom.json']

/** Migrations are read at run time, beside the bundle of what runs them. */
function copyMigrations(): Plugin {
  return {
    name: 'copy-migrations',
    applyToEnvironment: (environment) => environment.name === 'server',
    closeBundle() {
      cpSync('server/db/migrations', 'dist/server/migrations', { recursive: true })
    },
  }
}

/** For Node: packages stay in node_modules, our own code is bundled. */
const forNode = (outDir: string, input: Record<string, string>) => ({
  consumer: 'server' as const,
  build: {
    outDir,
    emptyOutDir: true,
    emitAssets: false,
    copyPublicDir: false,
    minify: false,
    sourcemap: true,
    target: 'node20',
    ssr: true,
    rollupOptions: { input, output: { entryFileNames: '[name].js', chunkFileNames: '[name]-[hash].js' } },
  },
})

export default defineConfig({
  plugins: [react(), tailwindcss(), copyMigrations()],
  server: {
    strictPort: true,
    proxy: Object.fromEntries(proxied.map((path) => [path, { target: apiOrigin, xfwd: true }])),
  },
  environments: {
    client: {
      build: { outDir: 'dist/client', emptyOutDir: true, manifest: true, rollupOptions: { input: 'index.html' } },
    },
    ssr: forNode('dist/ssr', { 'entry-server': resolve('src/entry-server.tsx') }),
    server: forNode('dist/server', {
      index: resolve('server/index.ts'),
      migrate: resolve('server/db/migrate.ts'),
      fakes: resolve('server/services/run-fakes.ts'),
      load: resolve('seeds/load.ts'),
      'sign-ins': resolve('seeds/sign-ins.ts'),
    }),
  },
  builder: {
    async buildApp(builder) {
      for (const environment of Object.values(builder.environments)) await builder.build(environment)
    },
  },
})
