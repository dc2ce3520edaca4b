// Which file may import which: the workspaces, the server's rows and the client's layers, in one place.
import { dirname, join, normalize } from 'node:path/posix';

/** Workspaces that the production code of a workspace may import, besides itself. */
const workspaces = {
  shared: [],
  db: ['shared'],
  fakes: [],
  server: ['shared', 'db'],
  client: ['shared'],
};

/** Rows of the server from the ground up; a folder imports from its own row and those before it. */
const serverRows = [
  ['platform'],
  ['people', 'settings', 'parts', 'suppliers', 'bills'],
  ['stock', 'journal', 'invoicing'],
  ['planning', 'purchasing', 'builds', 'units', 'testing', 'imports'],
  ['catalogue', 'orders', 'payments', 'shipping', 'returns', 'recalls'],
  ['books', 'today', 'find', 'doctor'],
  ['demo'],
];

/** Layers of the client and what each may import besides itself. */
const clientLayers = {
  app: ['api', 'features', 'components', 'lib'],
  features: ['api', 'components', 'lib'],
  components: ['lib'],
  api: ['lib'],
  lib: [],
};

/** What `shared` may take from outside: it runs in the browser and on the server alike. */
const sharedPackages = ['decimal.js', 'jsvat', 'mathjs'];

const isSpec = (file) => /\.(test|spec)\.tsx?$/.test(file);
/** Specs and what they are set up with may reach anywhere within their workspace. */
const isForTests = (file) =>
  isSpec(file) || /\/testing\.tsx?$/.test(file) || file.startsWith('server/src/platform/testing/');
const workspaceOf = (file) => file.split('/')[0];

/**
 * Where an import leads, as a path from the top of the repository, or undefined for a package from outside.
 * @param {string} from @param {string} specifier
 */
function destination(from, specifier) {
  if (specifier.startsWith('.')) return normalize(join(dirname(from), specifier));
  const ours = /^@emberlot\/([a-z0-9]+)\/?(.*)$/.exec(specifier);
  return ours ? `${ours[1]}/src/${ours[2]}` : undefined;
}

function workspaceFault(from, to) {
  const own = workspaceOf(from);
  const other = workspaceOf(to);
  if (own === other) return undefined;
  if (other === 'fakes' && isSpec(from)) return undefined;
  return workspaces[own].includes(other) ? undefined : `${own} must not import ${other}.`;
}

function serverFault(from, to) {
  const [own, other] = [from, to].map((file) => file.split('/').slice(2));
  const rowOf = (folder) => serverRows.findIndex((row) => row.includes(folder));
  // Files directly in src put the application together; the folders know nothing of them. The demo's loader is a program
  // of its own, as they are.
  if (own.length < 2 || from === 'server/src/demo/load.ts' || own[0] === other[0]) return undefined;
  if (rowOf(own[0]) < 0) return `server/src/${own[0]} stands in no row of the server's folders.`;
  if (other.length < 2) return `${own[0]} must not import what puts the application together.`;
  if (rowOf(other[0]) > rowOf(own[0])) return `${own[0]} must not import ${other[0]}, which stands below it.`;
  if (/\.repository(\.js)?$/.test(to)) return `${own[0]} must call a service of ${other[0]}, not its repository.`;
  return undefined;
}

function clientFault(from, to) {
  const [own, other] = [from, to].map((file) => file.split('/').slice(2));
  if (own.length < 2) return undefined;
  if (!(own[0] in clientLayers)) return `client/src/${own[0]} is none of the client's layers.`;
  if (own[0] !== other[0]) {
    return clientLayers[own[0]].includes(other[0]) ? undefined : `${own[0]} must not import ${other[0]}.`;
  }
  const inside = own[0] === 'features' && own[1] !== other[1] && other.length > 3;
  return inside
    ? `${own[1]} must not import the insides of ${other[1]}: use the files directly in its folder.`
    : undefined;
}

/**
 * @param {string} from the importing file, from the top of the repository: `server/src/stock/stock.service.ts`
 * @param {string} specifier what it imports, as written
 * @returns {string | undefined} what is wrong with it
 */
export function importFault(from, specifier) {
  const own = workspaceOf(from);
  if (!(own in workspaces) || from.split('/')[1] !== 'src') return undefined;
  const to = destination(from, specifier);
  if (to === undefined) {
    const refused = own === 'shared' && !isSpec(from) && !sharedPackages.includes(specifier);
    return refused ? `shared must not import ${specifier}: it knows no machine and no framework.` : undefined;
  }
  const fault = workspaceFault(from, to);
  if (fault || workspaceOf(to) !== own) return fault;
  if (own === 'server' && !isForTests(from)) return serverFault(from, to);
  if (own === 'client' && !isForTests(from)) return clientFault(from, to);
  return undefined;
}
