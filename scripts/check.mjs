// Everything that must hold, in order: what `npm test`, `npm run check` and CI run alike.
import { command, conclude, step, vitestProject } from './check-steps.mjs';

function tests(project, options) {
  return step(`${project} tests`, () => vitestProject(project, options));
}

conclude([
  step('type check', () => command('node_modules/typescript/bin/tsc', '--noEmit')),
  step('lint', () => command('node_modules/oxlint/bin/oxlint', '--type-aware', '--deny-warnings')),
  tests('domain'),
  // Server, architecture and browser tests read what the build made.
  step('build', () => command('scripts/ensure-deps.mjs', '--build')),
  tests('server'),
  tests('client'),
  tests('architecture'),
  // Empty until the first bug is mended.
  tests('regressions', { mayBeEmpty: true }),
  tests('browser'),
]);
