/** Who may import whom. DEVELOPERS.md, 'Map of the house', says why. */
const folders = 'app|components|geometry|server|shared|migrations|seeds|tests';

/** Code in `from` may import our own code only from `allowed`. */
const only = (from, allowed, comment) => ({
  name: `${from.replaceAll(/\W+/g, '-')}-only`,
  severity: 'error',
  comment,
  from: { path: `^(${from})/` },
  to: { path: `^(${folders})/`, pathNot: `^(${allowed})/` },
});

/** Value imports of `pkg` are allowed only in `allowed`. */
const confined = (pkg, allowed) => ({
  name: `${pkg.replaceAll(/\W+/g, '-')}-confined`,
  severity: 'error',
  from: { path: `^(${folders})/`, pathNot: `^(tests/|${allowed})` },
  to: { path: `node_modules/(@types/)?(${pkg})/`, dependencyTypesNot: ['type-only'] },
});

const g = (...names) => names.map((name) => `geometry/${name}`).join('|');
const layer = (name, ...below) => only(g(name), g(name, ...below), 'geometry layers point downwards');

module.exports = {
  forbidden: [
    only('geometry', 'geometry', 'geometry imports nothing but itself'),
    only('shared', 'shared|geometry', 'shared sits below client and server'),
    only('components', 'components|shared|geometry', 'components never see server or screens'),
    only('app', 'app|components|shared', 'a route file wires components, it computes nothing'),
    only('server', 'server|shared|geometry', 'the server never sees the UI'),
    only('migrations|seeds', 'migrations|seeds', 'history must not change when code does'),

    layer('core'),
    layer('tape', 'core'),
    layer('room', 'core', 'tape'),
    layer('top', 'core', 'tape', 'room'),
    layer('seams', 'core', 'tape', 'room', 'top'),
    layer('nest', 'core', 'tape'),
    layer('wood', 'core', 'tape', 'room', 'top', 'seams'),
    layer('findings', 'core', 'tape', 'room', 'top', 'seams', 'nest', 'wood'),
    layer('plan', 'core', 'tape', 'room', 'top', 'seams', 'nest', 'wood', 'findings'),
    layer('scene', 'core', 'tape', 'room', 'top', 'seams', 'nest', 'wood', 'findings', 'plan'),
    layer('export', 'core', 'tape', 'room', 'top', 'seams', 'nest', 'wood', 'findings', 'plan', 'scene'),

    {
      name: 'geometry-packages',
      severity: 'error',
      comment: 'geometry runs anywhere: only polygon-clipping and the matrix package',
      from: { path: '^geometry/' },
      to: {
        dependencyTypes: ['npm', 'npm-dev', 'npm-no-pkg', 'npm-unknown', 'core'],
        pathNot: 'node_modules/(polygon-clipping|ml-matrix)/',
      },
    },
    {
      name: 'routes-call-services',
      severity: 'error',
      from: { path: '^server/routes/' },
      to: { path: '^server/(repositories|db)/|node_modules/(knex|pg|pdfkit)/' },
    },
    {
      name: 'services-know-no-express',
      severity: 'error',
      from: { path: '^server/services/' },
      to: { path: 'node_modules/(@types/)?express/' },
    },
    {
      name: 'repositories-know-no-contracts',
      severity: 'error',
      from: { path: '^server/repositories/' },
      to: { path: '^shared/contracts/' },
    },
    confined('knex|pg', 'server/(repositories|db)/|migrations/|seeds/'),
    confined('express', 'server/(http|routes)/|server/app[.]ts$'),
    confined('pdfkit', 'server/sheets/'),
    { name: 'no-circular', severity: 'error', from: {}, to: { circular: true, dependencyTypesNot: ['type-only'] } },
  ],
  options: {
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.json' },
    doNotFollow: { path: 'node_modules' },
  },
};
