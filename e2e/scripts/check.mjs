// What every commit passes: format, build, lint, types, and generated files in step with what they are made from.
import { spawn } from 'node:child_process';
import { resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = resolve(fileURLToPath(import.meta.url), '../../..');

/** Steps of one group run at the same time; the next group stands on it. */
const groups = [
  {
    format: 'npx prettier --check --log-level warn --cache --cache-location .local/prettier-cache .',
    build: 'node server/scripts/build.mjs --node-only',
  },
  {
    'database files': 'node db/scripts/generate.mjs --check',
    'API types': 'node server/scripts/openapi.mjs --check',
    lint: 'npm run -s lint',
    'client types': 'npx tsc -p client --incremental --tsBuildInfoFile .local/client.tsbuildinfo',
    'browser test types': 'npx tsc -p e2e --incremental --tsBuildInfoFile .local/e2e.tsbuildinfo',
  },
];

function run(name, command) {
  const started = Date.now();
  return new Promise((done) => {
    const child = spawn(command, { cwd: root, shell: true, stdio: ['ignore', 'pipe', 'pipe'] });
    let output = '';
    for (const stream of [child.stdout, child.stderr]) stream.on('data', (chunk) => (output += chunk));
    child.once('close', (code) => {
      process.stdout.write(output);
      const seconds = ((Date.now() - started) / 1000).toFixed(1);
      console.log(`check: ${name} ${code === 0 ? 'ok' : 'FAILED'} (${seconds} s)`);
      done(code === 0);
    });
  });
}

for (const group of groups) {
  const results = await Promise.all(Object.entries(group).map(([name, command]) => run(name, command)));
  if (!results.every(Boolean)) process.exit(1);
}
