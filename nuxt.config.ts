import { fileURLToPath } from 'node:url'
import { listenEarly } from './plugins/keepTyped/listenEarly'

const at = (path: string) => fileURLToPath(new URL(path, import.meta.url))

export default defineNuxtConfig({
  modules: [
    '@pinia/nuxt',
    '@nuxtjs/tailwindcss',
    '@sidebase/nuxt-auth',
    '@formkit/nuxt',
    '@nuxt/eslint',
    'nuxt-security',
  ],
  // Nuxt 4's ways on the last 3.x: the 4.x that still runs on Node 20 lacks later security fixes.
  future: { compatibilityVersion: 4 },
  srcDir: '.',
  compatibilityDate: '2026-05-01',
  ignore: ['tests/**', 'seeds/**', '.data/**'],
  devtools: { enabled: false },
  telemetry: { enabled: false },
  typescript: { strict: true, tsConfig: { compilerOptions: { noUncheckedIndexedAccess: true }, exclude: ['../.output', '../.data'] } },
  css: ['~/assets/css/paper.css'],
  plugins: [{ src: '~/plugins/keepTyped/handOver.ts', mode: 'client' }],
  components: [{ path: '~/components', pathPrefix: false, extensions: ['vue'] }],
  app: {
    head: {
      htmlAttrs: { lang: 'en' },
      meta: [{ name: 'viewport', content: 'width=device-width, initial-scale=1' }, { name: 'color-scheme', content: 'light dark' }],
      // Schemas are told not to try making code from text: the content policy refuses it, and would report each try.
      script: [
        { innerHTML: 'globalThis.__zod_globalConfig={jitless:true}', tagPriority: 'critical' },
        { innerHTML: `(${listenEarly.toString()})()`, tagPriority: 'critical' }, // what is typed before the scripts have come is kept
      ],
      link: [{ rel: 'icon', type: 'image/svg+xml', href: '/favicon.svg' }],
    },
  },
  auth: {
    baseURL: '/api/auth',
    originEnvKey: 'AUTH_ORIGIN',
    provider: { type: 'authjs', trustHost: false },
    sessionRefresh: { enablePeriodically: false, enableOnWindowFocus: false },
  },
  formkit: { autoImport: false },
  vite: { build: { assetsInlineLimit: 0 } }, // fonts come as files: the content policy allows no data: fonts
  eslint: { config: { stylistic: false, standalone: true } },
  tailwindcss: { cssPath: '~/assets/css/paper.css', viewer: false },
  nitro: {
    serverAssets: [{ baseName: 'content', dir: at('./content') }],
    // The native add-on and the workers' own imports are traced; the rest of node_modules stays out.
    experimental: { openAPI: false },
  },
  security: {
    headers: {
      contentSecurityPolicy: {
        'default-src': ["'self'"],
        'base-uri': ["'none'"],
        'script-src': ["'self'", "'nonce-{{nonce}}'", "'strict-dynamic'"],
        'script-src-attr': ["'none'"],
        'style-src': ["'self'", "'nonce-{{nonce}}'"],
        'style-src-elem': ["'self'", "'nonce-{{nonce}}'"],
        'style-src-attr': ["'unsafe-inline'"], // KaTeX places its parts with style attributes
        'font-src': ["'self'"],
        'img-src': ["'self'", 'data:'],
        'connect-src': ["'self'"],
        'form-action': ["'self'"],
        'frame-ancestors': ["'none'"],
        'object-src': ["'none'"],
        'upgrade-insecure-requests': false,
      },
      crossOriginEmbedderPolicy: false,
      strictTransportSecurity: false,
      referrerPolicy: 'same-origin',
      xFrameOptions: 'DENY',
    },
    corsHandler: false,
    xssValidator: false,
    requestSizeLimiter: false, // bodies are counted while they stream: Content-Length can lie
    rateLimiter: false, // accounts and addresses are limited in the domain, where a classroom behind one address is known
    hidePoweredBy: true,
  },
})
