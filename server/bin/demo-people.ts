import { demoPeople } from '../db/seed/demo-people';

/** Who can sign in to the demo, for scripts: a JSON array of role, email and password. */
const people = demoPeople.map(({ role, email, password }) => ({ role, email, password }));
process.stdout.write(`${JSON.stringify(people, null, 2)}\n`);
