// The walls between rooms. DEVELOPERS.md draws the same map in words.
const rule = (name, from, to, comment) => ({ name, severity: 'error', comment, from: { path: from }, to })
const app = '^(pages|layouts|components|composables|stores|middleware|plugins)/|^(app|error)\\.vue$'

module.exports = {
  forbidden: [
    rule('thermo-is-pure', '^shared/thermo/', { pathNot: '^shared/(thermo|numerics|units/brands)' }, 'physics: numbers in, numbers out; no package, no node module'),
    rule('marking-reads-thermo', '^shared/marking/', { pathNot: '^shared/(marking|thermo|numerics|units|errors)' }, 'marking is pure on top of the physics'),
    rule('units-read-numerics', '^shared/units/', { pathNot: '^shared/(units|numerics)' }),
    rule('numerics-stand-alone', '^shared/numerics/', { pathNot: '^shared/numerics/' }),
    rule('shared-is-isomorphic', '^shared/', { path: `${app}|^server/|node_modules/(vue|pinia|kysely|h3|better-sqlite3)/` }),
    rule('app-asks-over-http', app, { path: '^server/' }),
    rule('state-knows-no-view', '^(composables|stores)/', { path: '^(pages|layouts|components)/' }),
    rule('components-know-no-page', '^components/', { path: '^(pages|layouts)/' }),
    rule('routes-are-thin', '^server/api/', { path: '^server/(db|observations|importing)/|node_modules/(kysely|better-sqlite3)/' }),
    rule('domain-knows-no-http', '^server/domain/', { path: '^server/(api|utils|middleware|plugins)/|node_modules/h3/' }),
    rule('db-knows-no-domain', '^server/db/', { path: '^server/(api|domain|utils)/|^shared/marking/' }),
    rule('observations-know-no-domain', '^server/observations/', { path: '^server/(api|domain|utils)/' }),
    rule('importing-is-apart', '^server/importing/', { path: '^server/(api|domain|utils|db)/' }),
    rule('product-knows-no-test', '^(shared|server|pages|components|composables|stores|layouts)/', { path: '^(tests|seeds)/', pathNot: '^seeds/' }),
    { name: 'no-cycles', severity: 'error', from: { path: '^(shared|server|pages|components|composables|stores|seeds)/' }, to: { circular: true } },
  ],
  options: { tsPreCompilationDeps: true, tsConfig: { fileName: 'tsconfig.json' }, doNotFollow: { path: 'node_modules' }, exclude: { path: '^(\\.nuxt|\\.output|node_modules|server/reference)/' } },
}
