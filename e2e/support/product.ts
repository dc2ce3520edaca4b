import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createTestDatabase } from '@emberlot/db/testing';
import { freePort } from '../../db/scripts/cluster.mjs';
import { startGuard } from '../../db/scripts/guard.mjs';
import { fakesEnvironment, localSecrets, serverEnvironment } from '../../server/scripts/local-settings.mjs';
import { startProcess, untilAnswers } from '../../server/scripts/processes.mjs';
import { root } from '../../server/scripts/root.mjs';

/** The built product with a database, stand-ins and ports of its own. */
export interface Product {
  /** Scheme, host and port under which the browser reaches it. */
  readonly url: string;
  /** The page of the mail catcher. */
  readonly mailUrl: string;
  /** The stand-in for the payments service. */
  readonly paymentsUrl: string;
  /** Connects as the server's role. */
  readonly databaseUrl: string;
  /** Connects as the owner of the schema. */
  readonly ownerDatabaseUrl: string;
  /** Makes the first owner of an empty shop. */
  readonly setUpCode: string;
  /** What the server has written so far. */
  serverLog(): string;
  /** Ends the server without warning, as a power cut would, and starts it again on the same data. */
  killAndRestart(): Promise<void>;
  stop(): Promise<void>;
}

type Child = ReturnType<typeof startProcess>;

async function choosePorts() {
  const [server, payments, smtp, mailPage] = await Promise.all([freePort(), freePort(), freePort(), freePort()]);
  return { server, payments, smtp, mailPage };
}

/** Starts the product on an empty shop; its own folder keeps the stand-ins' state and the logs. */
export async function startProduct(): Promise<Product> {
  const folder = mkdtempSync(join(tmpdir(), 'emberlot-browser-'));
  const guard = startGuard();
  guard.entrust({ folder });
  const [database, ports] = await Promise.all([createTestDatabase('browser'), choosePorts()]);
  const secrets = localSecrets(join(folder, 'secrets.json'));
  const url = `http://127.0.0.1:${ports.server}`;
  const env = serverEnvironment({ ports, secrets, databaseUrl: database.serverUrl, baseUrl: url });
  const start = (name: string, program: string, environment: NodeJS.ProcessEnv): Child =>
    startProcess({
      name,
      args: ['--enable-source-maps', join(root, program)],
      cwd: root,
      env: environment,
      log: join(folder, `${name}.log`),
      guard,
    });
  const startServer = async (): Promise<Child> => {
    const child = start('server', 'server/dist/main.js', env);
    await untilAnswers(`${url}/api/health/ready`, child);
    return child;
  };
  const stop = async (): Promise<void> => {
    await guard.end();
    await database.drop();
    rmSync(folder, { recursive: true, force: true });
  };
  try {
    const fakes = start(
      'fakes',
      'fakes/dist/main.js',
      fakesEnvironment({ ports, secrets, state: join(folder, 'fakes') }),
    );
    const mailUrl = `http://127.0.0.1:${ports.mailPage}`;
    await untilAnswers(mailUrl, fakes);
    let server = await startServer();
    return {
      url,
      mailUrl,
      paymentsUrl: `http://127.0.0.1:${ports.payments}`,
      databaseUrl: database.serverUrl,
      ownerDatabaseUrl: database.ownerUrl,
      setUpCode: secrets.setUp,
      serverLog: () => readFileSync(server.log, 'utf8'),
      killAndRestart: async () => {
        if (server.pid) process.kill(server.pid, 'SIGKILL');
        await server.exited;
        server = await startServer();
      },
      stop,
    };
  } catch (error) {
    await stop();
    throw error;
  }
}
