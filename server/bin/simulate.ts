import { runCommand } from './simulate/run-command';

/** Apart from 1 and 2, so that a defect of the program is never taken for a verdict. */
const INTERNAL_ERROR = 3;

// A reader that stops early (`… | head`) is no error of ours.
process.stdout.on('error', () => {});

runCommand(process.argv.slice(2)).then(
  ({ exitCode, output, errors }) => {
    process.exitCode = exitCode;
    process.stderr.write(errors);
    process.stdout.write(output);
  },
  (error: unknown) => {
    process.exitCode = INTERNAL_ERROR;
    process.stderr.write(`The program itself failed; please report this.\n${error instanceof Error ? error.stack : String(error)}\n`);
  },
);
