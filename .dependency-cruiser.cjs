/**
 * Arrows run one way: shared ← server/chem ← server/services ← server/routes ← server/app,
 * shared ← components ← app; the app never imports the server.
 */
const forbid = (name, from, to) => ({ name, severity: 'error', from, to });

/** `from` may import nothing but what `allowed` matches. */
const only = (name, from, allowed) => forbid(name, { path: from }, { pathNot: allowed });

const npm = (...names) => names.map((name) => `node_modules/${name}/`);

module.exports = {
  forbidden: [
    forbid('no-cycles', {}, { circular: true }),
    forbid('nothing-unresolved', {}, { couldNotResolve: true }),
    only('shared-stands-alone', '^shared/', ['^shared/', ...npm('zod', 'decimal\\.js')]),
    only('chem-is-pure', '^server/chem/', ['^server/chem/', ...npm('decimal\\.js')]),
    forbid(
      'services-know-no-routes',
      { path: '^server/services/' },
      { path: ['^server/(routes|http)/', '^server/(app|index|start-server|migrate|seed)\\.ts$'] },
    ),
    forbid(
      'database-knows-no-routes',
      { path: '^server/database/' },
      { path: ['^server/(routes|http)/', '^server/(app|index|start-server|migrate|seed)\\.ts$'] },
    ),
    forbid(
      'routes-know-no-app',
      { path: '^server/(routes|http)/' },
      { path: '^server/(app|index|start-server)\\.ts$' },
    ),
    forbid('server-knows-no-app', { path: '^server/' }, { path: '^(app|components)/' }),
    forbid('components-know-no-routes', { path: '^components/' }, { path: '^app/' }),
    forbid('app-knows-no-server', { path: '^(app|components)/' }, { path: '^(server|openapi)/' }),
    forbid(
      'product-knows-no-tools',
      { path: '^(app|components|shared|server|openapi)/' },
      { path: '^(tests|scripts)/' },
    ),
    forbid(
      'product-needs-no-development-package',
      { path: '^(app|components|shared|server)/' },
      { dependencyTypes: ['npm-dev', 'npm-no-pkg'], dependencyTypesNot: ['type-only', 'npm'] },
    ),
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '^(dist|\\.expo|\\.local|public)/' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.json' },
    enhancedResolveOptions: {
      extensions: ['.web.tsx', '.web.ts', '.tsx', '.ts', '.mjs', '.cjs', '.js', '.json'],
      exportsFields: ['exports'],
      conditionNames: ['import', 'require', 'node', 'default', 'types'],
    },
  },
};
