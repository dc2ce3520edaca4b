// Builds every Node workspace with TypeScript's own solution builder, then the client with Vite.
// The plain compiler would drop the OpenAPI metadata that @nestjs/swagger's plugin adds to the server's classes,
// so the server's programs are emitted through that plugin's transformer here.
//   node server/scripts/build.mjs [--node-only]
import { spawnSync } from 'node:child_process';
import { createRequire } from 'node:module';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';

const root = resolve(dirname(fileURLToPath(import.meta.url)), '../..');
const require = createRequire(pathToFileURL(join(root, 'server/package.json')));

/** @returns {boolean} whether every Node workspace compiled */
export function buildNode() {
  const ts = require('typescript');
  const { before } = require('@nestjs/swagger/plugin');
  const serverConfig = join(root, 'server/tsconfig.json');
  const programs = new Map();
  const createProgram = (names, options, host, old, diagnostics, references) => {
    const program = ts.createEmitAndSemanticDiagnosticsBuilderProgram(
      names,
      options,
      host,
      old,
      diagnostics,
      references,
    );
    if (options?.configFilePath) programs.set(resolve(options.configFilePath), program.getProgram());
    return program;
  };
  const report = (diagnostic) =>
    process.stderr.write(
      ts.formatDiagnosticsWithColorAndContext([diagnostic], {
        getCanonicalFileName: (name) => name,
        getCurrentDirectory: () => root,
        getNewLine: () => '\n',
      }),
    );
  const host = ts.createSolutionBuilderHost(ts.sys, createProgram, report, report);
  host.getCustomTransformers = (project) => {
    if (resolve(project) !== serverConfig) return {};
    const program = programs.get(serverConfig);
    return program ? { before: [before({ esmCompatible: true, introspectComments: true }, program)] } : {};
  };
  const builder = ts.createSolutionBuilder(host, [join(root, 'tsconfig.json')], {});
  return builder.build() === ts.ExitStatus.Success;
}

/** @returns {boolean} whether the client was bundled */
export function buildClient() {
  const vite = join(root, 'node_modules/vite/bin/vite.js');
  const run = spawnSync(process.execPath, [vite, 'build', '--logLevel', 'warn'], {
    cwd: join(root, 'client'),
    stdio: 'inherit',
  });
  return run.status === 0;
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const ok = buildNode() && (process.argv.includes('--node-only') || buildClient());
  process.exit(ok ? 0 : 1);
}
