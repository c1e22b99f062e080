import type { Config } from 'tailwindcss'

const token = (name: string) => `var(--${name})`
const colors = ['paper', 'sheet', 'wash', 'ink', 'pencil', 'rule', 'edge', 'rope', 'on-rope', 'sky', 'moss', 'brass', 'alarm', 'sky-wash', 'moss-wash', 'brass-wash', 'alarm-wash', 'p2', 'p3', 'p4', 'grid']

/** Tokens are custom properties (assets/css/tokens.css), so day and night need no variants here. */
export default {
  content: ['./app.vue', './error.vue', './pages/**/*.vue', './layouts/**/*.vue', './components/**/*.{vue,ts}', './assets/formkit.theme.ts'],
  corePlugins: { preflight: false },
  theme: {
    screens: { phone: { max: '760px' }, stack: { max: '1100px' } },
    colors: { transparent: 'transparent', current: 'currentColor', ...Object.fromEntries(colors.map(name => [name, token(name)])) },
    fontFamily: { serif: token('serif'), sans: token('sans'), mono: token('mono') },
    fontSize: { label: ['0.875rem', '1.25rem'], base: ['1rem', '1.5rem'], lab: ['1.0625rem', '1.75rem'], h3: ['1.25rem', '1.75rem'], h2: ['1.5625rem', '2rem'], h1: ['2.25rem', '2.75rem'] },
    spacing: { 0: '0', 1: '4px', 2: '8px', 3: '12px', 4: '16px', 5: '24px', 6: '32px', 7: '48px', 8: '72px', mast: '208px', margin: '112px', leaf: token('leaf') },
    borderRadius: { none: '0', full: '9999px' },
    boxShadow: { none: 'none' },
    borderWidth: { DEFAULT: '1px', 0: '0', 1.5: '1.5px', 2: '2px', 3: '3px' },
    extend: {},
  },
} satisfies Config
