import path from 'node:path';
import { dumpDatabase, requireData, withCluster } from './backup-file.mjs';
import { DATABASE, hasDatabase } from './databases.mjs';
import { ROOT } from './paths.mjs';
import { Remedy, runScript, say } from './say.mjs';

await runScript(async () => {
  requireData();
  await withCluster(async (cluster) => {
    if (!(await hasDatabase(cluster, DATABASE)))
      throw new Remedy('There are no data yet: npm start makes them.');
    const file = await dumpDatabase(cluster, DATABASE);
    say(`Backed up to ${path.relative(ROOT, file)}`);
    say(`Bring it back with: npm run restore -- ${path.relative(ROOT, file)}`);
  });
});
