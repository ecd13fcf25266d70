import type { IForbiddenRuleType } from 'dependency-cruiser'

/** Layers of shared/, lowest first. A layer may import those before it, never those after. */
export const SHARED_LAYERS = [
  ['units'],
  ['sections', 'materials'],
  ['stability'],
  ['standards'],
  ['base'],
  ['pricing'],
  ['quoting'],
  // Shapes are ranked by their real price, so a proposal stands on pricing.
  ['proposal'],
  ['drawing'],
  ['contracts'],
] as const

function layerRules(): IForbiddenRuleType[] {
  return SHARED_LAYERS.flatMap((layer, index) => {
    const higher = SHARED_LAYERS.slice(index + 1).flat()
    if (higher.length === 0) return []
    return [
      {
        name: `${layer.join('-and-')}-imports-only-what-is-lower`,
        comment:
          'What a clause needs lies below it: a reader can follow a number down and never in a circle.',
        severity: 'error',
        from: { path: `^shared/(${layer.join('|')})/` },
        to: { path: `^shared/(${higher.join('|')})/` },
      },
    ]
  })
}

export const RULES: IForbiddenRuleType[] = [
  {
    name: 'no-circles',
    comment: 'Two files that need each other are one file, or three.',
    severity: 'error',
    from: {},
    to: { circular: true },
  },
  {
    name: 'shared-stands-alone',
    comment: 'What decides must run anywhere: in the server, in the page, in a test, in a worker.',
    severity: 'error',
    from: { path: '^shared/' },
    to: { path: '^(web|server|migrations|seeds|tests)/' },
  },
  {
    name: 'shared-does-no-input-or-output',
    comment: 'A pure function is checked by hand; one that reads a file or a clock is not.',
    severity: 'error',
    from: { path: '^shared/' },
    to: { dependencyTypes: ['core'] },
  },
  {
    name: 'only-contracts-know-zod',
    comment: 'The engine works on plain values; the shape of messages is the business of the contracts.',
    severity: 'error',
    from: { path: '^shared/', pathNot: '^shared/contracts/' },
    to: { path: 'node_modules/zod' },
  },
  {
    name: 'shared-uses-few-libraries',
    comment: 'Exact decimals and money come from libraries, and nothing else is needed to decide.',
    severity: 'error',
    from: { path: '^shared/' },
    to: { path: 'node_modules/', pathNot: 'node_modules/(zod|decimal\\.js|dinero\\.js)' },
  },
  ...layerRules(),
  {
    name: 'web-and-server-never-meet',
    comment: 'They share decisions and contracts, nothing else.',
    severity: 'error',
    from: { path: '^web/' },
    to: { path: '^(server|migrations|seeds)/' },
  },
  {
    name: 'server-and-web-never-meet',
    comment: 'They share decisions and contracts, nothing else.',
    severity: 'error',
    from: { path: '^(server|migrations|seeds)/' },
    to: { path: '^web/' },
  },
  {
    name: 'components-only-show',
    comment: 'A component that fetches cannot be used twice or tested without a server.',
    severity: 'error',
    from: { path: '^web/components/' },
    to: { path: '^web/(api|stores|features|views|router)/' },
  },
  {
    name: 'features-do-not-import-features',
    comment: 'What two features need belongs to components or composables.',
    severity: 'error',
    from: { path: '^web/features/([^/]+)/' },
    to: { path: '^web/features/', pathNot: '^web/features/$1/' },
  },
  {
    name: 'features-do-not-import-views',
    comment: 'A view composes features; it is the top.',
    severity: 'error',
    from: { path: '^web/(features|composables|stores|api|format|components)/' },
    to: { path: '^web/views/' },
  },
  {
    name: 'modules-are-entered-by-their-service',
    comment: 'A module may change its tables without asking the others.',
    severity: 'error',
    from: { path: '^server/modules/([^/]+)/' },
    to: {
      path: '^server/modules/',
      pathNot: '^server/modules/($1/|[^/]+/[^/]+\\.(service|table)\\.ts$)',
    },
  },
  {
    name: 'tables-are-types-of-the-database',
    comment: 'A table type is read by the schema union, its own module and joins of repositories.',
    severity: 'error',
    from: { path: '^server/', pathNot: '^server/(db/|modules/.*\\.(repo|table|map)\\.ts$)' },
    to: { path: '^server/modules/.*\\.table\\.ts$', dependencyTypesNot: ['type-only'] },
  },
  {
    name: 'repositories-know-no-services',
    comment: 'routes → service → repo → db: data code decides nothing.',
    severity: 'error',
    from: { path: '\\.repo\\.ts$' },
    to: { path: '\\.(service|routes)\\.ts$' },
  },
  {
    name: 'services-know-no-routes',
    comment: 'routes → service → repo → db: a service can be called by a job as well as by a request.',
    severity: 'error',
    from: { path: '\\.(service|repo|map|table)\\.ts$' },
    to: { path: '\\.routes\\.ts$' },
  },
  {
    name: 'express-stays-at-the-door',
    comment: 'Services speak of requests for columns, not of HTTP.',
    severity: 'error',
    from: {
      path: '^server/',
      pathNot: '^server/(app\\.ts|http/|payments/fake/|mail/fake/|modules/.*\\.routes\\.ts$)',
    },
    to: { path: 'node_modules/(@types/)?express(-serve-static-core)?/' },
  },
  {
    name: 'kysely-stays-with-the-store',
    comment: 'Queries live in repositories, where the move to another database will be made.',
    severity: 'error',
    from: { path: '^(server|seeds)/', pathNot: '^server/(db/|modules/.*\\.(repo|table)\\.ts$)' },
    to: { path: 'node_modules/kysely', dependencyTypesNot: ['type-only'] },
  },
  {
    name: 'migrations-import-kysely-only',
    comment: 'A migration that imports our code changes its meaning when the code does.',
    severity: 'error',
    from: { path: '^migrations/\\d' },
    to: { pathNot: 'node_modules/kysely' },
  },
]
