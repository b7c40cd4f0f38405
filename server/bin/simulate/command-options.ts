import { Command, CommanderError, InvalidArgumentError, Option } from 'commander';

import { CHECK_IDS, type CheckId } from '../../../shared/model/check-id';
import { readOverride, type Override } from './override';
import { InputProblem } from './problem';

export interface CommandOptions {
  /** Path of the scenario, `-` for standard input; absent where only a schema is asked for. */
  file: string | undefined;
  csv: boolean;
  schema: 'scenario' | 'result' | undefined;
  overrides: readonly Override[];
  accepted: ReadonlySet<CheckId>;
}

const EXIT_CODES = `
Exit codes:
  0  within ratings
  1  a check fails or is not assessed, the run stopped early, or its audit is not clean
  2  the input was refused: standard error names the field, last line as JSON
  3  the program itself failed; no statement about the design

A result is "within rating", never "safe": mains voltage, stored charge and hot parts are
left to local codes and licensed practice.`;

const addChecks = (text: string, earlier: readonly CheckId[]): CheckId[] => {
  const named = text.split(',').map((id) => id.trim());
  const unknown = named.find((id) => !(CHECK_IDS as string[]).includes(id));
  if (unknown !== undefined) throw new InvalidArgumentError(`"${unknown}" is no check; the checks are ${CHECK_IDS.join(', ')}.`);
  return [...earlier, ...(named as CheckId[])];
};

const commandLine = () =>
  new Command('simulate')
    .description('Computes the power-up of a scenario file and holds it against the ratings. Prints JSON, SI throughout.')
    .argument('[scenario]', 'JSON file with SI numbers or text such as "470u"; - for standard input')
    .addOption(
      new Option('--at <key=value>', 'write a field anew, such as bulk.capacitance=470u or limiter.0.part.name=Spare (repeatable)')
        .argParser((text, earlier: readonly Override[]) => [...earlier, readOverride(text)])
        .default([], 'the file as it stands'),
    )
    .addOption(
      new Option('--accept-not-assessed <ids>', 'checks that need not be assessed, with commas between (repeatable)')
        .argParser(addChecks)
        .default([], 'none'),
    )
    .option('--csv', 'print the traces of the nominal run as CSV in place of the JSON')
    .addOption(new Option('--schema [of]', 'print a JSON Schema and end: of the scenario, or of the result').choices(['scenario', 'result']).preset('scenario'))
    .addHelpText('after', EXIT_CODES)
    .exitOverride()
    .configureOutput({ writeErr: () => {} });

/** Null where help was asked for and given. */
export const readOptions = (words: readonly string[]): CommandOptions | null => {
  const command = commandLine();
  try {
    command.parse(words, { from: 'user' });
  } catch (error) {
    if (!(error instanceof CommanderError)) throw error;
    if (error.exitCode === 0) return null;
    throw new InputProblem('The command was not understood; --help lists its options.', [{ path: 'command', message: error.message.replace(/^error: /, '') }]);
  }
  const { at, acceptNotAssessed, csv = false, schema } = command.opts<{
    at: readonly Override[];
    acceptNotAssessed: readonly CheckId[];
    csv?: boolean;
    schema?: CommandOptions['schema'];
  }>();
  const [file] = command.args;
  if (file === undefined && schema === undefined)
    throw new InputProblem('No scenario was given.', [{ path: 'command', message: 'name a scenario file, or - for standard input' }]);
  return { file, csv, schema, overrides: at, accepted: new Set(acceptNotAssessed) };
};
