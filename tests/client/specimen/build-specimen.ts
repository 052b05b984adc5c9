import { mkdtemp, readFile, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath, pathToFileURL } from 'node:url'
import tailwindcss from '@tailwindcss/vite'
import react from '@vitejs/plugin-react'
import { build, type InlineConfig } from 'vite'

const root = fileURLToPath(new URL('.', import.meta.url))

/** Builds the specimen page as the product is built (server-rendered, then hydrated) and returns its folder. */
export async function buildSpecimen(): Promise<string> {
  const environment = process.env.NODE_ENV
  // Else a test runner's own environment would give React's development build.
  process.env.NODE_ENV = 'production'
  try {
    return await buildForProduction()
  } finally {
    process.env.NODE_ENV = environment
  }
}

async function buildForProduction(): Promise<string> {
  const folder = await mkdtemp(join(tmpdir(), 'stillfits-specimen-'))
  const shared: InlineConfig = {
    root,
    configFile: false,
    logLevel: 'error',
    base: '/',
    plugins: [react(), tailwindcss()],
  }
  await build({ ...shared, build: { outDir: join(folder, 'client'), emptyOutDir: true } })
  await build({
    ...shared,
    build: { outDir: join(folder, 'server'), ssr: join(root, 'entry-server.tsx'), emptyOutDir: true },
    ssr: { noExternal: true },
  })
  const entry = pathToFileURL(join(folder, 'server/entry-server.js')).href
  const { renderSpecimen } = (await import(/* @vite-ignore */ entry)) as { renderSpecimen: () => string }
  const page = join(folder, 'client/index.html')
  await writeFile(page, (await readFile(page, 'utf8')).replace('<!--app-->', renderSpecimen()))
  return join(folder, 'client')
}
