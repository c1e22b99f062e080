import { en } from '@formkit/i18n'
import { defineFormKitConfig } from '@formkit/vue'
import { rootClasses } from './assets/formkit.theme'

export default defineFormKitConfig({
  locale: 'en',
  locales: { en },
  icons: {},
  iconLoader: () => undefined, // the default one reaches for another site
  config: { rootClasses, validationVisibility: 'submit' },
})
