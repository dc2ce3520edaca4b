import { createDatabase } from '@emberlot/db/database';
import { examine } from './doctor/examine.js';

/** Prints what was checked and every violation; ends with 1 when there is any. */
async function main(): Promise<number> {
  const url = process.env['DATABASE_URL'];
  if (!url) {
    process.stderr.write('DATABASE_URL is not set: say which database to look at.\n');
    return 2;
  }
  const database = createDatabase(url, { applicationName: 'emberlot-doctor', statementMilliseconds: 300_000 });
  try {
    const findings = await examine(database, new Date());
    for (const { name, promise, violations } of findings) {
      process.stdout.write(`${violations.length === 0 ? 'sound ' : 'BROKEN'} ${name}: ${promise}\n`);
      for (const { what } of violations) process.stdout.write(`         ${what}\n`);
    }
    const broken = findings.reduce((sum, { violations }) => sum + violations.length, 0);
    process.stdout.write(`${findings.length} rules checked, ${broken} violations.\n`);
    return broken === 0 ? 0 : 1;
  } finally {
    await database.destroy();
  }
}

process.exitCode = await main();
