import type { Config } from 'tailwindcss'

export default {
  content: ['./app.vue', './error.vue', './pages/**/*.vue', './layouts/**/*.vue', './components/**/*.{vue,ts}', './assets/formkit.theme.ts'],
  corePlugins: { preflight: false },
  theme: { extend: {} },
} satisfies Config
