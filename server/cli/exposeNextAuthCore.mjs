// next-auth 4.22 and later leave `./core` out of their exports, and @sidebase/nuxt-auth imports it.
// Runs at postinstall and puts the entry back; running it again changes nothing.
import { readFileSync, writeFileSync } from 'node:fs'

const manifest = new URL('../../node_modules/next-auth/package.json', import.meta.url)
const text = readFileSync(manifest, 'utf8')
const parsed = JSON.parse(text)
if (!parsed.exports['./core']) {
  parsed.exports['./core'] = { types: './core/index.d.ts', default: './core/index.js' }
  writeFileSync(manifest, `${JSON.stringify(parsed, null, 2)}\n`)
}
