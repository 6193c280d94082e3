import { dumpDatabase, requireStopped, withCluster } from './backup-file.mjs';
import { DATABASE, createDatabase, databaseEnv, dropDatabase, hasDatabase } from './databases.mjs';
import { bringUpToDate } from './migrations.mjs';
import { runTypeScript } from './run-program.mjs';
import { Remedy, runScript, say } from './say.mjs';

await runScript(async () => {
  if (process.env.APP_MODE === 'live')
    throw new Remedy('demo:reset works in demo mode only; APP_MODE is live.');
  requireStopped();
  await withCluster(async (cluster) => {
    if (await hasDatabase(cluster, DATABASE)) {
      say(`The data from before are in ${await dumpDatabase(cluster, DATABASE)}`);
      await dropDatabase(cluster, DATABASE);
    }
    await createDatabase(cluster, DATABASE);
    await bringUpToDate(cluster, DATABASE);
    await runTypeScript('server/bin/seed.ts', { env: databaseEnv(cluster, DATABASE) });
    say('The demo data are as on the first day. Go on with: npm start');
  });
});
