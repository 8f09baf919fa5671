import { runCheck } from './run-check.ts';

const { exitCode, stdout, stderr } = await runCheck(process.argv.slice(2));
process.stdout.write(stdout);
process.stderr.write(stderr);
// Not process.exit: a long report in a pipe would be cut.
process.exitCode = exitCode;
