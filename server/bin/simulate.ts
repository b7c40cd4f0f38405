import { runCommand } from './simulate/run-command';

// A reader that stops early (`… | head`) is no error of ours.
process.stdout.on('error', () => {});

void runCommand(process.argv.slice(2)).then(({ exitCode, output, errors }) => {
  process.exitCode = exitCode;
  process.stderr.write(errors);
  process.stdout.write(output);
});
