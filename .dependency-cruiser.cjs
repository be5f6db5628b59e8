/**
 * Who may import whom. The table stands in DEVELOPERS.md ("The import table"); this file is that table and nothing
 * else: what is not allowed here is refused, and there is no list of exceptions.
 */

const server =
  '^(lib/(services|gateways|commands)/|lib/(auth|carrier-webhook|deps|desk|env|clock|http|log)\\.ts$|db/|jobs/|app/)'

/** One row of the table: modules of `from` may import modules of `to`, as types only when asked. */
function row(from, to, dependencyTypes) {
  return { from: { path: from }, to: { path: to, ...(dependencyTypes ? { dependencyTypes } : {}) } }
}

/** Packages are resolved into node_modules; Node's own modules have no folder and are named as they are. */
function packages(from, names) {
  const list = names.map((name) => name.replaceAll('/', '\\/')).join('|')
  return row(from, `^node_modules/(@types/)?(${list})(/|$)`)
}

function node(from) {
  return { from: { path: from }, to: { dependencyTypes: ['core'] } }
}

function anyPackage(from) {
  return { from: { path: from }, to: { path: '^node_modules/' } }
}

const typesOnly = ['type-only']

const allowed = [
  // The core.
  row('^lib/domain/', '^lib/domain/'),
  packages('^lib/domain/', [
    'date-fns',
    '@date-fns/tz',
    'sms-segments-calculator',
    'fastest-levenshtein',
    'intl-messageformat',
  ]),

  // Borders.
  row('^lib/schemas/', '^lib/(schemas|domain)/'),
  packages('^lib/schemas/', ['zod', '@asteasolutions/zod-to-openapi', 'libphonenumber-js']),
  row('^lib/env\\.ts$', '^lib/(schemas|domain)/'),
  row('^lib/clock\\.ts$', '^lib/env\\.ts$'),
  row('^lib/gateways/', '^lib/(gateways|domain|schemas)/|^lib/env\\.ts$'),
  packages('^lib/gateways/', ['twilio', 'nodemailer']),

  // The database.
  row('^db/', '^lib/domain/', typesOnly),
  row('^db/', '^db/(?!seed/)|^lib/env\\.ts$'),
  packages('^db/', ['drizzle-orm', 'pg', '@electric-sql/pglite']),
  row('^db/seed/', '^(lib|db|jobs)/'),
  anyPackage('^db/seed/'),

  // Use cases.
  row('^lib/services/', '^lib/(services|domain|schemas)/|^db/(?!seed/)|^jobs/queues\\.ts$'),
  row('^lib/services/', '^lib/gateways/|^lib/(deps|clock)\\.ts$', typesOnly),
  packages('^lib/services/', [
    'date-fns',
    'date-holidays',
    '@date-fns/tz',
    '@node-rs/argon2',
    'libphonenumber-js',
  ]),

  // The composition root, the session gate, the wrapper of routes.
  row('^lib/auth\\.ts$', '^db/(?!seed/)|^lib/domain/|^lib/(env|deps|clock)\\.ts$'),
  packages('^lib/auth\\.ts$', [
    'next-auth',
    'next',
    '@node-rs/argon2',
    'rate-limiter-flexible',
    'zod',
  ]),
  row(
    '^lib/deps\\.ts$',
    '^db/(?!seed/)|^lib/(domain|gateways)/|^lib/(env|clock)\\.ts$|^jobs/boss\\.ts$',
  ),
  row('^lib/deps\\.ts$', '^lib/schemas/', typesOnly),
  packages('^lib/deps\\.ts$', ['next', 'server-only']),
  row('^lib/http\\.ts$', '^lib/(schemas|services|domain)/|^lib/(auth|deps)\\.ts$'),
  packages('^lib/http\\.ts$', ['next', 'zod', 'next-auth']),
  row('^lib/carrier-webhook\\.ts$', '^lib/schemas/|^lib/env\\.ts$'),
  packages('^lib/carrier-webhook\\.ts$', ['twilio']),
  row('^lib/desk\\.ts$', '^lib/domain/|^lib/auth\\.ts$'),
  packages('^lib/desk\\.ts$', ['next', 'react']),

  // Jobs.
  row('^jobs/', '^jobs/|^lib/(services|schemas)/|^lib/(deps|env|clock)\\.ts$'),
  row('^jobs/boss\\.ts$', '^db/client\\.ts$'),
  packages('^jobs/', ['pg-boss', 'zod', 'pg', '@electric-sql/pglite', 'drizzle-orm']),

  // Screens.
  row('^components/', '^components/|^lib/(domain|schemas)/'),
  row(
    '^app/',
    '^(app|components)/|^lib/(domain|schemas|services)/|^lib/(auth|carrier-webhook|deps|desk|http)\\.ts$',
  ),
  packages('^(app|components)/', [
    'react',
    'react-dom',
    'next',
    'next-auth',
    '@tanstack',
    'd3-scale',
    'd3-shape',
    '@fontsource-variable',
    'zod',
    'date-fns',
    '@date-fns/tz',
  ]),
  row('^(instrumentation|proxy)\\.ts$', '^lib/(deps|auth|env|log)\\.ts$|^jobs/'),
  packages('^(instrumentation|proxy)\\.ts$', ['next', 'next-auth']),

  // Command-line entries: they start things, so they may reach everything a server may.
  row('^lib/commands/', '^(lib|db|jobs)/'),
  anyPackage('^lib/commands/'),

  // The log is open to every server module; the core stays silent.
  row(server, '^lib/log\\.ts$'),
  row('^lib/log\\.ts$', '^lib/env\\.ts$'),
  packages('^lib/log\\.ts$', ['pino']),

  // Node itself and the marker of server modules.
  node(
    '^lib/(services|gateways|commands)/|^lib/(auth|deps|env|clock|http|log)\\.ts$|^db/|^jobs/|^(app|tests)/',
  ),
  node('^(instrumentation|proxy)\\.ts$'),
  packages(server, ['server-only']),

  // Tests see everything.
  row('^tests/', '^(app|components|db|jobs|lib|tests)/|^(instrumentation|proxy)\\.ts$'),
  anyPackage('^tests/'),
]

/** @type {import('dependency-cruiser').IConfiguration} */
module.exports = {
  allowed,
  allowedSeverity: 'error',
  forbidden: [
    { name: 'no-cycles', severity: 'error', from: {}, to: { circular: true } },
    { name: 'found', severity: 'error', from: {}, to: { couldNotResolve: true } },
    {
      name: 'tests-are-never-imported',
      severity: 'error',
      from: { pathNot: '^tests/' },
      to: { path: '^tests/' },
    },
    {
      name: 'entries-are-never-imported',
      severity: 'error',
      from: { pathNot: '^(lib/commands|db/seed|tests)/' },
      to: { path: '^(lib/commands|db/seed)/' },
    },
    {
      name: 'no-barrels',
      severity: 'error',
      from: {},
      to: { path: '^(app|components|db|jobs|lib|tests)/.*index\\.tsx?$' },
    },
    {
      name: 'no-drawers',
      comment: 'A name that says nothing gathers everything.',
      severity: 'error',
      from: {},
      to: { path: '^(?!node_modules).*/(utils?|helpers?|common|misc|manager)(/|\\.)' },
    },
  ],
  options: {
    tsConfig: { fileName: 'tsconfig.json' },
    tsPreCompilationDeps: true,
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '^(\\.next|\\.data)/' },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'require', 'node', 'default', 'types'],
      extensions: ['.ts', '.tsx', '.mjs', '.js', '.json', '.css', '.d.ts'],
    },
  },
}
