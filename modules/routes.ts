import { readdirSync } from 'node:fs'
import { join, relative, sep } from 'node:path'
import { createResolver, defineNuxtModule } from '@nuxt/kit'

interface RouteFile { file: string, method: string, path: string }

/** Every route file of `server/api` with its method and path, as Nitro reads them. Next-auth's catch-all is not ours to describe. */
export function routeFiles(dir: string): RouteFile[] {
  return readdirSync(dir, { recursive: true, withFileTypes: true })
    .filter(entry => entry.isFile() && entry.name.endsWith('.ts') && !entry.name.startsWith('[...'))
    .map(entry => join(entry.parentPath, entry.name))
    .map((file) => {
      const name = relative(dir, file).split(sep).join('/').replace(/\.ts$/, '')
      const [, stem, method = 'get'] = /^(.*?)(?:\.(get|post|put|patch|delete))?$/.exec(name)!
      const path = `/api/${stem!.replace(/\/index$/, '').replace(/\[(\w+)\]/g, '{$1}')}`
      return { file, method, path }
    })
    .sort((a, b) => a.path.localeCompare(b.path) || a.method.localeCompare(b.method))
}

/** Gathers the routes into the virtual module `#routes`, from which the API's description is made. */
export default defineNuxtModule({
  meta: { name: 'routes' },
  setup(_options, nuxt) {
    const { resolve } = createResolver(nuxt.options.rootDir)
    nuxt.hook('nitro:config', (config) => {
      config.virtual ??= {}
      config.virtual['#routes'] = () => {
        const files = routeFiles(resolve('server/api')).filter(route => !route.file.endsWith('openapi.json.get.ts'))
        const imports = files.map((route, at) => `import r${at} from ${JSON.stringify(route.file)}`).join('\n')
        const list = files.map((route, at) => `  { method: ${JSON.stringify(route.method)}, path: ${JSON.stringify(route.path)}, handler: r${at} },`).join('\n')
        return `${imports}\nexport const routes = [\n${list}\n]\n`
      }
    })
  },
})
