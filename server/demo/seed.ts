import type { Role } from '../../shared/access/roles.ts';
import type { AppDeps } from '../appDeps.ts';
import { User } from '../entities/User.ts';
import { reviseBuildUp } from '../services/buildUps.ts';
import { addConfiguration } from '../services/configurations.ts';
import { createFixture } from '../services/fixtures.ts';
import { addFrictionTest } from '../services/frictionTests.ts';
import { createUser } from '../services/createUser.ts';
import { refreshBoundaries } from '../services/currentBoundary.ts';
import { storeLog } from '../services/logs.ts';
import type { Actor } from '../services/recordEvent.ts';
import { demoScenario, type DemoFixture } from './scenario.ts';

const password = 'hold-below-the-line';

/** Invented people, one a role; they exist only where demo data were seeded. */
const people: { email: string; name: string; role: Role }[] = [
  { email: 'engineer@tautline.example', name: 'Demo engineer', role: 'engineer' },
  { email: 'analyst@tautline.example', name: 'Demo analyst', role: 'analyst' },
  { email: 'manager@tautline.example', name: 'Demo manager', role: 'manager' },
  { email: 'admin@tautline.example', name: 'Demo administrator', role: 'administrator' },
];

/** Fills an empty database with the demo scenario, through the services that people use. */
export async function seedDemo(deps: AppDeps): Promise<void> {
  if ((await deps.dataSource.getRepository(User).count()) > 0) return;
  let engineer: Actor | undefined;
  for (const { email, name, role } of people) {
    const actor = await createUser(deps, { email, name, roles: [role], password });
    if (role === 'engineer') engineer = actor;
  }
  if (engineer === undefined) throw new Error('the demo needs an engineer');
  for (const fixture of demoScenario()) await seedFixture(deps, fixture, engineer);
  await refreshBoundaries(deps);
}

async function seedFixture(deps: AppDeps, demo: DemoFixture, engineer: Actor): Promise<void> {
  const firstDay = demo.logs[0]?.uploadedAt ?? deps.clock().toISOString();
  // Entered a week before the first trials.
  const entered = at(deps, new Date(Date.parse(firstDay) - 7 * 86_400_000));
  const fixture = await createFixture(entered, demo.fixture, engineer);
  const { id, version } = fixture;
  await reviseBuildUp(entered, id, { version, ...demo.buildUp }, engineer);
  for (const one of demo.configurations) await addConfiguration(entered, id, one, engineer);
  for (const test of demo.frictionTests) await addFrictionTest(entered, id, test, engineer);
  for (const { fileName, text, uploadedAt } of demo.logs) {
    const file = { name: fileName, bytes: new TextEncoder().encode(text) };
    const upload = { fixtureId: id, file, mapping: {} };
    const { answer } = await storeLog(at(deps, new Date(uploadedAt)), upload, engineer);
    if (answer.log.refused > 0) {
      throw new Error(`demo log ${fileName}: ${answer.problems[0]?.reason ?? 'rows were refused'}`);
    }
  }
}

/** The same application at another moment. */
function at(deps: AppDeps, moment: Date): AppDeps {
  return { ...deps, clock: () => moment };
}
