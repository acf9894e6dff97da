import { ensureClient } from './client.mjs';
import { openDatabase } from './database.mjs';
import { ensurePackages } from './packages.mjs';
import { main, passSignalsOn } from './run.mjs';
import { runSideBySide } from './side-by-side.mjs';
import { webSettings } from './web-settings.mjs';

await main(async () => {
  await ensurePackages();
  await ensureClient();
  passSignalsOn();
  const database = await openDatabase();
  try {
    const { env, args } = await webSettings(database, 'production');
    const web = ['--import', 'tsx', 'server/index.ts', ...args];
    return await runSideBySide([{ command: process.execPath, args: web, env }]);
  } finally {
    await database.stop();
  }
});
