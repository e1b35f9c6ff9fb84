/** `npm run test:postgres`: the database and API tests on a PostgreSQL server, given or started here. */
import { ensureInstalled } from '../../server/start/ensure-installed.mjs';

ensureInstalled((words) => console.log(`· ${words}`));
const { startPostgres } = await import('./start-postgres.mjs');
const { runVitest } = await import('./run-vitest.mjs');

const given = process.env.TEST_DATABASE_URL;
const server = given ? { url: given, stop: () => {} } : await startPostgres();
const { passed, failed } = await runVitest('database', { env: { TEST_DATABASE_URL: server.url } });
server.stop();
console.log(`${passed} passed, ${failed} failed`);
process.exit(failed === 0 ? 0 : 1);
