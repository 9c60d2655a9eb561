/** Imports run one way: app → components → drafting; app → app/_server → db → drafting. */
const rules = {
  forbidden: [
    {
      name: 'drafting-is-pure',
      comment: 'The engine imports only itself, bezier-js and clipper2-ts.',
      severity: 'error',
      from: { path: '^drafting/' },
      to: { pathNot: '^drafting/|^node_modules/(@types/)?(bezier-js|clipper2-ts)/' },
    },
    {
      name: 'components-are-presentational',
      comment: 'Data in, callbacks out: never the database, server code, actions or queries.',
      severity: 'error',
      from: { path: '^components/' },
      to: { path: '^(db|app)/|^node_modules/(@tanstack/react-query|swr|sequelize|next-auth)/' },
    },
    {
      name: 'db-below-app',
      severity: 'error',
      from: { path: '^db/' },
      to: { path: '^(app|components)/' },
    },
    {
      name: 'server-below-routes',
      severity: 'error',
      from: { path: '^app/_server/' },
      to: { path: '^components/|^app/\\((site|auth|workroom)\\)/' },
    },
    {
      name: 'only-access-touches-models',
      comment: 'db/access is the only way in: it takes the actor and authorises.',
      severity: 'error',
      from: { path: '^app/' },
      to: { path: '^db/(models|connection)' },
    },
    {
      name: 'migrations-import-nothing',
      severity: 'error',
      from: { path: '^migrations/' },
      to: { path: '^(app|db|drafting|components)/' },
    },
    {
      name: 'no-circles',
      comment: 'Types may refer to each other; modules may not need each other to load.',
      severity: 'error',
      from: {},
      to: { circular: true, viaOnly: { dependencyTypesNot: ['type-only'] } },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '^(\\.next[^/]*|\\.data|\\.cache)/' },
    tsConfig: { fileName: 'tsconfig.json' },
    tsPreCompilationDeps: true,
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'require', 'node', 'default', 'types'],
    },
  },
}

export default rules
