import { installed } from './clone.mjs';
import { openDatabase } from './database.mjs';
import { ensurePackages } from './packages.mjs';
import { main, passSignalsOn } from './run.mjs';
import { runSideBySide } from './side-by-side.mjs';
import { webSettings } from './web-settings.mjs';

await main(async () => {
  await ensurePackages();
  passSignalsOn();
  const database = await openDatabase();
  try {
    const { env, args } = await webSettings(database, 'development');
    return await runSideBySide([
      { command: installed('tsx'), args: ['watch', 'server/index.ts', ...args], env },
      { command: installed('vite'), args: ['--host', '127.0.0.1'], env },
    ]);
  } finally {
    await database.stop();
  }
});
