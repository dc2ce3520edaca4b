// What every commit passes: format, build, generated files in step, lint, types.
import { spawnSync } from 'node:child_process';

/** @type {[string, string, string[]][]} */
const steps = [
  ['format', 'npx', ['prettier', '--check', '--log-level', 'warn', '.']],
  ['build', 'node', ['server/scripts/build.mjs', '--node-only']],
  ['generated database files', 'node', ['db/scripts/generate.mjs', '--check']],
  ['generated API types', 'node', ['server/scripts/openapi.mjs', '--check']],
  ['lint', 'npm', ['run', '-s', 'lint']],
  ['client types', 'npx', ['tsc', '-p', 'client']],
];

for (const [name, command, args] of steps) {
  const started = Date.now();
  const { status } = spawnSync(command, args, { stdio: 'inherit' });
  if (status !== 0) {
    console.error(`check: ${name} failed`);
    process.exit(1);
  }
  console.log(`check: ${name} ok (${((Date.now() - started) / 1000).toFixed(1)} s)`);
}
