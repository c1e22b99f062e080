import { existsSync, readdirSync } from 'node:fs'
import { basename, join } from 'node:path'
import { createResolver, defineNuxtModule } from '@nuxt/kit'
import { build } from 'esbuild'

/** Bundles each `server/workers/*.ts` into a file of its own beside the built server, for `dev` and `build` alike. */
export default defineNuxtModule({
  meta: { name: 'workers' },
  setup(_options, nuxt) {
    const { resolve } = createResolver(nuxt.options.rootDir)
    const from = resolve('server/workers')
    nuxt.hook('nitro:init', (nitro) => {
      nitro.hooks.hook('compiled', async () => {
        const files = existsSync(from) ? readdirSync(from).filter(file => file.endsWith('.ts')) : []
        if (files.length === 0) return
        await build({
          entryPoints: files.map(file => ({ in: join(from, file), out: basename(file, '.ts') })),
          outdir: join(nitro.options.output.serverDir, 'workers'),
          outExtension: { '.js': '.mjs' },
          bundle: true,
          platform: 'node',
          target: 'node20',
          format: 'esm',
          alias: { '#shared': resolve('shared') },
          external: ['better-sqlite3'],
          banner: { js: 'import { createRequire as makeRequire } from \'node:module\'; const require = makeRequire(import.meta.url);' },
          logLevel: 'warning',
        })
      })
    })
    if (nuxt.options.dev) nuxt.options.watch.push(from)
  },
})
