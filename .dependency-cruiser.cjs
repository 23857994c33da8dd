/** Who may import whom. Each rule says why; a folder not named here may be imported by nobody but its own. */
const pure = '^lib/domain/[^/]+/(schema|types|rules|policy)\\.ts$'

/** @type {import('dependency-cruiser').IConfiguration} */
module.exports = {
  forbidden: [
    {
      name: 'no-circles',
      severity: 'error',
      comment: 'A circle has no first file to read.',
      from: {},
      to: { circular: true, viaOnly: { dependencyTypesNot: ['type-only'] } },
    },
    {
      name: 'science-is-pure',
      severity: 'error',
      comment: 'The science stands on its own: it imports itself, and the sky also the ephemeris.',
      from: { path: '^lib/science/' },
      to: { pathNot: ['^lib/science/', 'node_modules/astronomy-engine'] },
    },
    {
      name: 'panel-mathematics-is-pure',
      severity: 'error',
      comment: 'Statistics and allocation know science and themselves, nothing that does input or output.',
      from: { path: '^lib/panel/' },
      to: { pathNot: ['^lib/panel/', '^lib/science/', 'node_modules/(highs|mathjs)'] },
    },
    {
      name: 'format-is-pure',
      severity: 'error',
      comment: 'Formats are shared by page, mail and PDF.',
      from: { path: '^lib/format/' },
      to: { pathNot: ['^lib/format/', '^lib/science/'] },
    },
    {
      name: 'writing-is-pure',
      severity: 'error',
      comment: 'Texts are read alike in the browser, on the server and for print.',
      from: { path: '^lib/writing/' },
      to: { path: '^(lib|db|app|components|pdf)/', pathNot: ['^lib/(writing|format)/'] },
    },
    {
      name: 'knex-only-in-db',
      severity: 'error',
      comment: 'SQL lives in db; whoever needs rows calls a query.',
      from: { pathNot: ['^db/', '^knexfile\\.ts$', '^tests/', '^scripts/'] },
      to: { path: 'node_modules/(knex|mysql2)/' },
    },
    {
      name: 'db-only-from-domain',
      severity: 'error',
      comment:
        'Rows are reached by verbs, and by the edge that opens the services. Pages and components never.',
      from: {
        pathNot: [
          '^db/',
          '^lib/domain/',
          '^lib/jobs/',
          '^lib/services/services\\.ts$',
          '^tests/',
          '^scripts/',
        ],
      },
      to: { path: '^db/' },
    },
    {
      name: 'vendor-kits-in-their-service',
      severity: 'error',
      comment: 'A vendor is swapped in one file.',
      from: { pathNot: ['^lib/services/', '^tests/', '^scripts/fakes/'] },
      to: { path: 'node_modules/(stripe|@aws-sdk|nodemailer)/' },
    },
    {
      name: 'components-stay-thin',
      severity: 'error',
      comment: 'Views know pure files and formats; verbs reach them as props from the page.',
      from: { path: '^components/' },
      to: {
        path: '^(lib|db|app|pdf)/',
        pathNot: [
          '^lib/(format|science|panel|writing)/',
          '^lib/paths\\.ts$',
          '^lib/actions/result\\.ts$',
          '^lib/domain/actor\\.ts$',
          '^lib/fieldErrorsOf\\.ts$',
          pure,
          '^lib/domain/[^/]+/[a-z][A-Za-z]+(Words|List|View|Schema|Form)\\.ts$',
          '^lib/domain/[^/]+/(categories|limits)\\.ts$',
          '^lib/domain/tools/yardstick/',
        ],
        dependencyTypesNot: ['type-only'],
      },
    },
    {
      name: 'yardstick-computes-anywhere',
      severity: 'error',
      comment:
        'The same folder runs in the browser and on the server: science, formats, units and pure schemas.',
      from: { path: '^lib/domain/tools/yardstick/' },
      to: {
        path: '^(lib|db|app|components|pdf)/|node_modules/',
        pathNot: [
          '^lib/(format|science)/',
          '^lib/domain/tools/yardstick/',
          '^lib/domain/proposals/cosmologyForm\\.ts$',
          'node_modules/(mathjs|zod)/',
        ],
        dependencyTypesNot: ['type-only'],
      },
    },
    {
      name: 'domain-below-the-edges',
      severity: 'error',
      comment: 'A verb knows nothing of pages, actions or HTTP.',
      from: { path: '^lib/domain/' },
      to: { path: ['^app/', '^components/', '^lib/actions/', '^lib/http/', 'node_modules/next/'] },
    },
    {
      name: 'pdf-is-pure-data',
      severity: 'error',
      comment: 'Documents are drawn from data: formats, science and types.',
      from: { path: '^pdf/' },
      to: {
        path: '^(lib|db|app|components)/',
        pathNot: [
          '^lib/(format|science|writing)/',
          '^components/charts/geometry/',
          '^components/ui/verdictGlyphPath\\.ts$',
        ],
        dependencyTypesNot: ['type-only'],
      },
    },
    {
      name: 'nobody-imports-tests-or-scripts',
      severity: 'error',
      comment: 'Tests and scripts stand at the end of the chain.',
      from: { pathNot: ['^tests/', '^scripts/', '^[^/]+$'] },
      to: { path: '^(tests|scripts)/' },
    },
    {
      name: 'resolvable',
      severity: 'error',
      comment: 'An import that leads nowhere; of mdast there are only types.',
      from: {},
      to: { couldNotResolve: true, pathNot: '^mdast$' },
    },
  ],
  options: {
    tsConfig: { fileName: 'tsconfig.json' },
    tsPreCompilationDeps: true,
    doNotFollow: { path: 'node_modules' },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'require', 'node', 'default', 'types'],
      extensions: ['.ts', '.tsx', '.mjs', '.js', '.json'],
    },
  },
}
