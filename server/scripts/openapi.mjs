// Writes the client's API types from the built server's own routes and DTOs.
//   node server/scripts/openapi.mjs            writes client/src/api/schema.d.ts
//   node server/scripts/openapi.mjs --check    fails when it differs from what the code says
//   node server/scripts/openapi.mjs --print    prints the OpenAPI document
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { join, resolve } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';

const root = resolve(fileURLToPath(import.meta.url), '../../..');
const output = join(root, 'client/src/api/schema.d.ts');

/** The application is only looked at: nothing connects, so the settings lead nowhere. */
const settings = {
  NODE_ENV: 'test',
  DATABASE_URL: 'postgres://nobody@127.0.0.1:9/none',
  BASE_URL: 'http://127.0.0.1:9',
  SESSION_SECRET: 'none',
  STRIPE_SECRET_KEY: 'none',
  STRIPE_WEBHOOK_SECRET: 'none',
  SMTP_URL: 'smtp://127.0.0.1:9',
  MAIL_FROM: 'none@shop.example',
  SHOP_ZONE: 'Europe/Dublin',
  LOG_LEVEL: 'silent',
  TRUST_PROXY: '',
};

/** @returns {Promise<object>} the OpenAPI document of the server in `server/dist` */
async function describeServer() {
  Object.assign(process.env, settings);
  const { createDocument } = await import(pathToFileURL(join(root, 'server/dist/platform/http/api-document.js')).href);
  const { AppModule } = await import(pathToFileURL(join(root, 'server/dist/app.module.js')).href);
  return createDocument(AppModule);
}

/** The compiler tells the members of a union in an order that depends on what it met before; here they have one. */
function withSortedChoices(value) {
  if (Array.isArray(value)) return value.map(withSortedChoices);
  if (typeof value !== 'object' || value === null) return value;
  const entries = Object.entries(value).map(([key, item]) => [
    key,
    key === 'enum' && Array.isArray(item)
      ? [...item].sort((one, other) => String(one).localeCompare(String(other)))
      : withSortedChoices(item),
  ]);
  return Object.fromEntries(entries);
}

/** @returns {Promise<string>} the types as they are committed */
async function typesOf(document) {
  const require = createRequire(join(root, 'client/package.json'));
  const { default: openapiTS, astToString } = require('openapi-typescript');
  const { format, resolveConfig } = createRequire(join(root, 'package.json'))('prettier');
  const text = astToString(await openapiTS(document, { defaultNonNullable: false, alphabetize: true }));
  const header = '// Written by server/scripts/openapi.mjs from the routes of the server. Do not edit.\n\n';
  return format(header + text, { ...(await resolveConfig(output)), parser: 'typescript' });
}

const document = withSortedChoices(await describeServer());
if (process.argv.includes('--print')) {
  console.log(JSON.stringify(document, null, 2));
} else {
  const types = await typesOf(document);
  const present = existsSync(output) ? readFileSync(output, 'utf8') : '';
  if (process.argv.includes('--check')) {
    if (types !== present) {
      console.error('client/src/api/schema.d.ts is not what the server says: run node server/scripts/openapi.mjs');
      process.exit(1);
    }
  } else if (types !== present) {
    writeFileSync(output, types);
  }
}
process.exit(0);
