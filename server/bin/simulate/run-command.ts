import { readFile } from 'node:fs/promises';
import { z } from 'zod';

import { scenarioSchema } from '../../../shared/model/scenario';
import { readOptions, type CommandOptions } from './command-options';
import { InputProblem, problemText } from './problem';
import { readScenario } from './read-scenario';
import { resultOf, resultSchema } from './result';
import { tracesCsv } from './traces-csv';

export interface Finished {
  exitCode: 0 | 1 | 2;
  output: string;
  errors: string;
}

const asJson = (value: unknown) => `${JSON.stringify(value, null, 2)}\n`;

const standardInput = async (): Promise<string> => {
  const chunks: Buffer[] = [];
  for await (const chunk of process.stdin) chunks.push(chunk as Buffer);
  return Buffer.concat(chunks).toString('utf8');
};

const FILE_REASONS: Readonly<Record<string, string>> = {
  ENOENT: 'there is no such file',
  EISDIR: 'it is a folder',
  EACCES: 'you may not read it',
};
const reasonOf = ({ code, message }: NodeJS.ErrnoException) => FILE_REASONS[code ?? ''] ?? message;

const textOf = async (file: string): Promise<string> => {
  if (file === '-') return standardInput();
  try {
    return await readFile(file, 'utf8');
  } catch (error) {
    throw new InputProblem('The scenario file cannot be read.', [{ path: file, message: reasonOf(error as NodeJS.ErrnoException) }]);
  }
};

const schemaOf = (what: NonNullable<CommandOptions['schema']>) =>
  what === 'scenario'
    ? z.toJSONSchema(scenarioSchema, { io: 'input', target: 'draft-2020-12' })
    : z.toJSONSchema(resultSchema, { io: 'output', target: 'draft-2020-12' });

const run = async (words: readonly string[]): Promise<Finished> => {
  const options = readOptions(words);
  if (!options) return { exitCode: 0, output: '', errors: '' };
  if (options.schema) return { exitCode: 0, output: asJson(schemaOf(options.schema)), errors: '' };
  const scenario = readScenario(await textOf(options.file!), options.overrides);
  // Loaded only now: a refused input is answered without the engine.
  const { assess } = await import('../../../simulation');
  const assessment = assess(scenario, { envelope: false });
  const result = resultOf(scenario.name, assessment, options.accepted);
  return { exitCode: result.withinRatings ? 0 : 1, output: options.csv ? tracesCsv(assessment.run.traces) : asJson(result), errors: '' };
};

/** The whole command but for writing out; a refused input is an outcome, not an exception. */
export const runCommand = async (words: readonly string[]): Promise<Finished> => {
  try {
    return await run(words);
  } catch (error) {
    if (error instanceof InputProblem) return { exitCode: 2, output: '', errors: problemText(error) };
    throw error;
  }
};
