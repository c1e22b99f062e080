import { createResolver, defineNuxtModule } from '@nuxt/kit'
import { bundleReference } from '../server/cli/bundleReference'

/**
 * Puts the judge's bundle, as text, into the built server (`#reference`): the server judges with that very text
 * and keeps it beside the marks that it made. Nothing is bundled at run time.
 */
export default defineNuxtModule({
  meta: { name: 'reference' },
  setup(_options, nuxt) {
    const { resolve } = createResolver(nuxt.options.rootDir)
    nuxt.hook('nitro:config', (config) => {
      config.virtual ??= {}
      config.virtual['#reference'] = async () => {
        const { bundle, goldenSha256 } = await bundleReference(resolve('.'))
        return `export const bundle = ${JSON.stringify(bundle)}\nexport const goldenSha256 = ${JSON.stringify(goldenSha256)}\n`
      }
    })
  },
})
