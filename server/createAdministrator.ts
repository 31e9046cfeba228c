import { createInterface } from 'node:readline/promises';
import { parseArgs } from 'node:util';
import { z } from 'zod';
import { lineSchema } from '../shared/schemas/common.ts';
import { createDataSource } from './dataSource.ts';
import { createDeps } from './createDeps.ts';
import { readEnv } from './env.ts';
import { ProblemError } from './http/problem.ts';
import { createUser } from './services/createUser.ts';

/** `--email … --name …`; asks for the password on standard input, never on the command line. */
async function main(): Promise<void> {
  const { values } = parseArgs({
    options: { email: { type: 'string' }, name: { type: 'string' } },
  });
  const email = z.email().parse(values.email);
  const name = lineSchema(120).parse(values.name);
  const prompt = createInterface({ input: process.stdin, output: process.stderr });
  const password = await prompt.question('Password (12 characters or more): ');
  prompt.close();

  const env = readEnv(process.env);
  const dataSource = await createDataSource(env.database, 1).initialize();
  const deps = createDeps(env, dataSource);
  try {
    await createUser(deps, { email, name, roles: ['administrator'], password });
    console.log(`${name} can sign in now with ${email}.`);
  } finally {
    await Promise.all([dataSource.destroy(), deps.work.close(), deps.passwords.close()]);
  }
}

main().catch((error: unknown) => {
  if (error instanceof z.ZodError) {
    console.error(
      'Usage: npm run create-administrator -- --email you@plant.example --name "Your Name"',
    );
  } else {
    console.error(error instanceof ProblemError ? `${error.message}` : error);
  }
  process.exitCode = 1;
});
