/** Who may import whom. Each rule says what it protects; type-only imports count unless a rule says otherwise. */
/** @type {{ dependencyTypesNot: import('dependency-cruiser').DependencyType[] }} */
const isRuntime = { dependencyTypesNot: ['type-only'] }
const product = '^(server|src|shared)/'

/** @type {import('dependency-cruiser').IConfiguration} */
export default {
  forbidden: [
    {
      name: 'no-circles',
      comment: 'Modules that need each other cannot be understood or tested apart.',
      severity: 'error',
      from: {},
      to: { circular: true },
    },
    {
      name: 'nothing-unresolved',
      severity: 'error',
      from: {},
      to: { couldNotResolve: true },
    },
    {
      name: 'pure-core',
      comment: 'The engine, units and kinds import each other alone: no packages, clock, randomness or I/O.',
      severity: 'error',
      from: { path: '^shared/(engine|units|kinds)/' },
      to: { pathNot: '^shared/(engine|units|kinds)/' },
    },
    {
      name: 'doubts-from-kinds-alone',
      comment: 'What looks unlikely is judged alike by form, server and review: from kinds and units, without I/O.',
      severity: 'error',
      from: { path: '^shared/unlikely/' },
      to: { pathNot: '^shared/(unlikely|units|kinds)/' },
    },
    {
      name: 'shared-knows-only-zod',
      severity: 'error',
      from: { path: '^shared/(?!(engine|units|kinds|unlikely)/)' },
      to: { pathNot: '^shared/|node_modules/zod/' },
    },
    {
      name: 'server-not-client',
      comment: 'The server loads the built client; it imports none of its sources.',
      severity: 'error',
      from: { path: '^server/' },
      to: { path: '^src/' },
    },
    {
      name: 'client-not-server',
      severity: 'error',
      from: { path: '^src/' },
      to: { path: '^server/' },
    },
    {
      name: 'client-without-node',
      severity: 'error',
      from: { path: '^src/', pathNot: '^src/entry-server\\.tsx$' },
      to: { dependencyTypes: ['core'] },
    },
    {
      name: 'product-apart-from-tests-and-demo-data',
      severity: 'error',
      from: { path: product },
      to: { path: '^(seeds|tests|scripts)/' },
    },
    {
      name: 'product-without-development-packages',
      severity: 'error',
      from: { path: product },
      to: {
        dependencyTypes: ['npm-dev', 'npm-no-pkg', 'npm-unknown'],
        dependencyTypesNot: ['type-only'],
        pathNot: '/@types/',
      },
    },
    {
      name: 'scripts-on-bare-node',
      comment: 'They run before anything is installed.',
      severity: 'error',
      from: { path: '^scripts/(lib/|[^/]+\\.mjs$)' },
      to: { path: '.', pathNot: '^scripts/', dependencyTypesNot: ['core', 'type-only', 'type-import'] },
    },
    {
      name: 'express-at-the-edge',
      comment: 'Only routes, server/http and the assembly know Express.',
      severity: 'error',
      from: { path: '^(server|seeds)/', pathNot: '^server/(http/|app\\.ts$|modules/[^/]+/[^/]+\\.routes\\.ts$)' },
      to: {
        path: 'node_modules/(@types/)?(express|express-serve-static-core|express-rate-limit|helmet|compression|multer)/',
      },
    },
    {
      name: 'drizzle-in-queries',
      comment: 'Only queries, server/db and the audit know Drizzle and the driver.',
      severity: 'error',
      from: { path: '^(server|seeds)/', pathNot: '^server/(db/|lib/audit|modules/[^/]+/[^/]+\\.queries\\.ts$)' },
      to: { path: 'node_modules/((@types/)?pg|drizzle-orm)/' },
    },
    {
      name: 'tables-in-queries',
      severity: 'error',
      from: { path: '^(server|seeds)/', pathNot: '^server/(db/|lib/audit|modules/[^/]+/[^/]+\\.queries\\.ts$)' },
      to: { path: '^server/db/schema/', ...isRuntime },
    },
    {
      name: 'modules-by-their-services',
      comment: "A module calls another module's service, never its queries or routes.",
      severity: 'error',
      from: { path: '^server/modules/([^/]+)/' },
      to: { path: '^server/modules/[^/]+/[^/]+\\.(queries|routes)\\.ts$', pathNot: '^server/modules/$1/' },
    },
    {
      name: 'routes-through-services',
      severity: 'error',
      from: { path: '^server/modules/[^/]+/[^/]+\\.routes\\.ts$' },
      to: { path: '^server/(modules/[^/]+/[^/]+\\.queries\\.ts$|db/)', ...isRuntime },
    },
    {
      name: 'services-without-http',
      severity: 'error',
      from: { path: '^server/modules/[^/]+/[^/]+\\.(service|queries|policy|presenter)\\.ts$' },
      to: { path: '^server/http/' },
    },
    {
      name: 'leaves-stay-leaves',
      comment: 'Policies and presenters decide and describe; they fetch nothing.',
      severity: 'error',
      from: { path: '^server/modules/[^/]+/[^/]+\\.(policy|presenter)\\.ts$' },
      to: { path: '^server/(db/|modules/[^/]+/[^/]+\\.(service|queries|routes)\\.ts$)', ...isRuntime },
    },
    {
      name: 'features-apart',
      comment: 'Features do not import features; pages compose them.',
      severity: 'error',
      from: { path: '^src/features/([^/]+)/' },
      to: { path: '^src/features/', pathNot: '^src/features/$1/' },
    },
    {
      name: 'features-below-app',
      severity: 'error',
      from: { path: '^src/features/' },
      to: { path: '^src/app/' },
    },
    {
      name: 'blocks-below-features',
      severity: 'error',
      from: { path: '^src/(components|lib|config)/' },
      to: { path: '^src/(app|features)/' },
    },
    {
      name: 'no-barrels',
      comment: 'A barrel pulls in everything; only the tables, the kinds and their checks are wanted whole.',
      severity: 'error',
      from: { pathNot: '^(tests|seeds)/' },
      to: {
        path: '/index[.]tsx?$',
        pathNot: '^(node_modules/|(server/db/schema|shared/kinds|shared/engine/checks)/index)',
      },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    tsPreCompilationDeps: true,
    detectJSDocImports: true,
    tsConfig: { fileName: 'tsconfig.json' },
    enhancedResolveOptions: { exportsFields: ['exports'], conditionNames: ['import', 'types', 'node', 'default'] },
  },
}
