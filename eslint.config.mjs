import withNuxt from './.nuxt/eslint.config.mjs'

const approximated = ['exp', 'expm1', 'log', 'log10', 'log2', 'log1p', 'pow', 'sin', 'cos', 'tan', 'asin', 'acos', 'atan', 'atan2', 'sinh', 'cosh', 'tanh', 'asinh', 'acosh', 'atanh', 'cbrt', 'hypot', 'random']

export default withNuxt(
  { ignores: ['.output/**', '.nuxt/**', '.data/**', 'server/reference/**'] },
  {
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      'vue/multi-word-component-names': 'off',
      'vue/no-v-html': 'error',
      'vue/html-self-closing': 'off',
      'vue/max-attributes-per-line': 'off',
      'vue/singleline-html-element-content-newline': 'off',
      'no-console': ['error', { allow: ['error', 'warn'] }],
    },
  },
  {
    // The same bits on every engine: what the language leaves approximate comes from shared/numerics.
    files: ['shared/thermo/**/*.ts', 'shared/numerics/**/*.ts', 'shared/marking/**/*.ts', 'shared/units/**/*.ts'],
    rules: {
      'no-restricted-syntax': ['error',
        ...approximated.map(name => ({ selector: `MemberExpression[object.name="Math"][property.name="${name}"]`, message: `Math.${name} differs between engines: use shared/numerics.` })),
        { selector: 'BinaryExpression[operator="**"]', message: '** differs between engines: use pow from shared/numerics.' },
        { selector: 'AssignmentExpression[operator="**="]', message: '** differs between engines: use pow from shared/numerics.' },
      ],
    },
  },
  {
    files: ['shared/**/*.ts'],
    rules: { 'no-restricted-globals': ['error', 'window', 'document', 'process', 'localStorage'] },
  },
  {
    files: ['server/api/**/*.ts'],
    ignores: ['server/api/auth/**'],
    rules: {
      'no-restricted-syntax': ['error',
        ...['selectFrom', 'insertInto', 'updateTable', 'deleteFrom'].map(name => ({ selector: `CallExpression[callee.property.name="${name}"]`, message: 'A route asks a use case; it does not query.' })),
        { selector: 'CallExpression[callee.name=/^(defineEventHandler|eventHandler|defineCachedEventHandler)$/]', message: 'Routes are made by defineApiHandler, which names their action.' },
      ],
    },
  },
  { files: ['server/cli/**', 'tests/**', 'seeds/**'], rules: { 'no-console': 'off' } },
)
