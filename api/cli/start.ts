import { demoAccounts, demoPassword } from '../demo-accounts.ts';
import { readEnv } from '../env.ts';
import { seedIfEmpty } from '../seed/demo.ts';
import { startServer } from '../server.ts';
import { buildSite } from './build-site.ts';

const say = (line: string) => process.stdout.write(`${line}\n`);

try {
  const env = readEnv(process.env);
  // The address and the log share a terminal; a person starting the product wants the address.
  const quiet = { ...env, LOG_LEVEL: process.env['LOG_LEVEL'] ? env.LOG_LEVEL : ('warn' as const) };
  say('Tubeplate');
  say((await buildSite()) ? '  site built' : '  site already built');
  const server = await startServer(quiet, async (deps) => {
    say('  database open and migrated');
    if (env.isDemo) await seedIfEmpty(deps, (line) => say(`  ${line}`));
  });
  say(`\nOpen ${server.url}\n`);
  if (env.isDemo) {
    say(`Demonstration accounts, password ${demoPassword}:`);
    for (const { email, part } of demoAccounts) say(`  ${email.padEnd(32)} ${part}`);
    say(`\nLetters the site sends: ${server.url}/letters`);
    if (server.deps.fakePaymentsUrl)
      say(`Notices of the stand-in payment service: ${server.deps.fakePaymentsUrl}/control`);
  }

  let isStopping = false;
  const stop = () => {
    if (isStopping) return;
    isStopping = true;
    say('\nStopping: finishing what is under way…');
    server.close().then(
      () => process.exit(0),
      (error: unknown) => {
        process.stderr.write(`Could not close in order: ${String(error)}\n`);
        process.exit(1);
      },
    );
  };
  process.once('SIGTERM', stop);
  process.once('SIGINT', stop);
} catch (error) {
  process.stderr.write(`\n${error instanceof Error ? error.message : String(error)}\n`);
  process.exit(1);
}
