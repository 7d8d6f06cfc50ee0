import { run } from './children.mjs';
import { CommandFailed, Fault } from './fault.mjs';
import { diskFull, saysDiskFull, tail } from './messages.mjs';
import { inRoot, root } from './paths.mjs';

async function cli(name, url, whatFailed, whatToDo) {
  try {
    return await run(process.execPath, [inRoot('db/dist/cli', `${name}.js`)], {
      cwd: root,
      env: { ...process.env, DATABASE_URL: url },
      log: `db-${name}`,
    });
  } catch (error) {
    if (!(error instanceof CommandFailed)) throw error;
    if (saysDiskFull(error)) throw diskFull();
    throw new Fault(whatFailed, `${tail(error.output)}\nAll of it: ${error.log}\n${whatToDo}`);
  }
}

/** Brings a database to the newest schema. */
export async function migrate(url) {
  const whatToDo =
    'The migration that failed changed nothing: each is one transaction. Mend it and start again, or throw the\n' +
    'demo data away with "npm run reset".';
  await cli('migrate', url, 'A database migration failed.', whatToDo);
  return 'schema up to date';
}

/** Loads the demo data unless it is there. */
export async function seed(url) {
  await cli('seed', url, 'The demo data could not be loaded.', '"npm run reset" begins afresh.');
  return 'loaded';
}

/** Empties the database, migrates and loads the demo data. */
export async function reset(url) {
  await cli('reset', url, 'The demo data could not be made afresh.', 'Mend what it says and run it again.');
  return 'made afresh';
}
