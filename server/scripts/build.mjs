// Builds every Node workspace with TypeScript's own solution builder, then the client with Vite; only what changed.
// The plain compiler would drop the OpenAPI metadata that @nestjs/swagger's plugin adds to the server's classes,
// so the server's programs are emitted through that plugin's transformer here.
//   node server/scripts/build.mjs [--node-only] [--watch]
import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, readdirSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { join, resolve } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { withLock } from '../../db/scripts/lock.mjs';
import { root } from './root.mjs';

const require = createRequire(pathToFileURL(join(root, 'server/package.json')));

function report(ts) {
  return (diagnostic) =>
    process.stderr.write(
      ts.formatDiagnosticsWithColorAndContext([diagnostic], {
        getCanonicalFileName: (name) => name,
        getCurrentDirectory: () => root,
        getNewLine: () => '\n',
      }),
    );
}

/** A program factory that remembers the programs by their configuration, and the transformers that need them. */
function withMetadata(ts) {
  const { before } = require('@nestjs/swagger/plugin');
  const serverConfig = join(root, 'server/tsconfig.json');
  const programs = new Map();
  const createProgram = (names, options, ...rest) => {
    const program = ts.createEmitAndSemanticDiagnosticsBuilderProgram(names, options, ...rest);
    if (options?.configFilePath) programs.set(resolve(options.configFilePath), program.getProgram());
    return program;
  };
  const getCustomTransformers = (project) => {
    if (resolve(project) !== serverConfig) return {};
    const program = programs.get(serverConfig);
    return program ? { before: [before({ esmCompatible: true, introspectComments: true }, program)] } : {};
  };
  return { createProgram, getCustomTransformers };
}

/** @returns {boolean} whether every Node workspace compiled */
export function buildNode() {
  const ts = require('typescript');
  const { createProgram, getCustomTransformers } = withMetadata(ts);
  const host = ts.createSolutionBuilderHost(ts.sys, createProgram, report(ts), report(ts));
  host.getCustomTransformers = getCustomTransformers;
  const builder = ts.createSolutionBuilder(host, [join(root, 'tsconfig.json')], {});
  return builder.build() === ts.ExitStatus.Success;
}

/** Compiles again after each change, until the process ends. */
export function watchNode() {
  const ts = require('typescript');
  const { createProgram, getCustomTransformers } = withMetadata(ts);
  const host = ts.createSolutionBuilderWithWatchHost(ts.sys, createProgram, report(ts), report(ts), report(ts));
  host.getCustomTransformers = getCustomTransformers;
  ts.createSolutionBuilderWithWatch(host, [join(root, 'tsconfig.json')], {}, { preserveWatchOutput: true }).build();
}

/** What the client's bundle is made from, as one digest. */
function clientFingerprint() {
  const hash = createHash('sha256').update(readFileSync(join(root, 'package-lock.json')));
  for (const folder of ['client', 'client/src', 'client/public', 'shared/src']) {
    const path = join(root, folder);
    if (!existsSync(path)) continue;
    const entries = readdirSync(path, { withFileTypes: true, recursive: folder !== 'client' });
    const files = entries
      .filter((entry) => entry.isFile())
      .map((entry) => join(entry.parentPath ?? entry.path, entry.name));
    for (const file of files.toSorted()) hash.update(`\n${file.slice(root.length)}\n`).update(readFileSync(file));
  }
  return hash.digest('hex');
}

/** @returns {boolean} whether the client is bundled from what stands there now */
export function buildClient() {
  const stamp = join(root, 'client/dist/.built-from');
  const fingerprint = clientFingerprint();
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === fingerprint) return true;
  const vite = join(root, 'node_modules/vite/bin/vite.js');
  const run = spawnSync(process.execPath, [vite, 'build', '--logLevel', 'warn'], {
    cwd: join(root, 'client'),
    stdio: 'inherit',
  });
  if (run.status === 0) writeFileSync(stamp, fingerprint);
  return run.status === 0;
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  if (process.argv.includes('--watch')) {
    watchNode();
  } else {
    // A start and a test run of the same checkout may want to build at the same time.
    const ok = await withLock(
      join(root, '.local/build.lock'),
      () => buildNode() && (process.argv.includes('--node-only') || buildClient()),
      600,
    );
    process.exit(ok ? 0 : 1);
  }
}
