/** Imports run one way; see DEVELOPERS.md. */
const forbid = (name, from, to, comment) => ({ name, severity: 'error', comment, from, to });

module.exports = {
  forbidden: [
    forbid('no-circular', {}, { circular: true }, 'A cycle has no bottom.'),
    forbid(
      'acoustics-stands-alone',
      { path: '^shared/src/acoustics/', pathNot: '\\.test\\.ts$' },
      { pathNot: '^shared/src/acoustics/' },
      'The physics imports nothing from outside acoustics.',
    ),
    forbid(
      'shared-is-pure',
      { path: '^shared/src/', pathNot: '\\.test\\.ts$' },
      { path: '^(server|client|tests)/' },
      'Shared code knows neither server nor client.',
    ),
    forbid(
      'analysis-below-fit',
      { path: '^shared/src/(analysis|music|lengths|document)/' },
      { path: '^shared/src/(fit|tolerance|contract|rules)/' },
      'analysis and document lie below fit, tolerance, contract and rules.',
    ),
    forbid('client-not-server', { path: '^client/' }, { path: '^server/' }, 'They meet in shared/ only.'),
    forbid('server-not-client', { path: '^server/' }, { path: '^client/src/' }, 'They meet in shared/ only.'),
    forbid(
      'client-features-apart',
      { path: '^client/src/features/([^/]+)/' },
      { path: '^client/src/features/', pathNot: '^client/src/features/$1/' },
      'What two features need moves down, or the page hands it in.',
    ),
    forbid(
      'server-features-apart',
      { path: '^server/src/features/([^/]+)/' },
      { path: '^server/src/features/', pathNot: '^server/src/features/$1/' },
      'What two features need moves down to models, db or rules.',
    ),
    forbid(
      'client-floors',
      { path: '^client/src/(ui|lib|bench)/' },
      { path: '^client/src/(features|pages)/' },
      'ui, lib and bench lie below features and pages.',
    ),
    forbid(
      'not-to-tests',
      { path: '^(shared|server|client)/', pathNot: '\\.test\\.tsx?$' },
      { path: '^tests/' },
      'Products do not import tests.',
    ),
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.json' },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'require', 'node', 'default', 'types'],
    },
  },
};
