/** `npm run db:seed`: brings the database up to date, fills it with the demo where it is empty, and says how to sign in. */
import { connect } from '../connect';
import { migrateDatabase } from '../migrate';
import { findPeople } from '../queries/people';
import { DEMO_PASSWORD, DEMO_PEOPLE } from './people';
import { fillDemo } from './seed';

function say(line: string): void {
  process.stdout.write(`${line}\n`);
}

async function run(url: string): Promise<void> {
  await migrateDatabase(url);
  const { db, close } = connect(url, { most: 2 });
  try {
    const filled = await fillDemo(db, new Date());
    const there = new Set(
      await findPeople(
        db,
        DEMO_PEOPLE.map((person) => person.email),
      ),
    );
    if (filled) say('The database was empty: the demo sites are in it now.');
    if (there.size === 0) return;
    say(`Demo sign-ins, all with the password ${DEMO_PASSWORD}`);
    for (const { email, cedarBend, harrowLane } of DEMO_PEOPLE) {
      if (there.has(email)) say(`  ${email}  (Cedar Bend: ${cedarBend}, Harrow Lane: ${harrowLane})`);
    }
  } finally {
    await close();
  }
}

const url = process.env.DATABASE_URL;
if (url === undefined || url === '') {
  process.stderr.write('DATABASE_URL: the address of the database is needed, postgres://…\n');
  process.exit(1);
}
await run(url);
