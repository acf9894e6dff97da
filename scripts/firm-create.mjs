import { openDatabase } from './database.mjs';
import { ensurePackages } from './packages.mjs';
import { main, passSignalsOn, run } from './run.mjs';

await main(async () => {
  await ensurePackages();
  passSignalsOn();
  const database = await openDatabase();
  try {
    const args = ['--import', 'tsx', 'server/cli/firm-create.ts', ...process.argv.slice(2)];
    const env = { ...process.env, ...database.env };
    return (await run(process.execPath, args, { env })).code;
  } finally {
    await database.stop();
  }
});
