// Reads an OpenAPI document from standard input and prints what is wrong with it, as JSON. On its own
// because the validator is an ES module, which jest does not load.
import { Validator } from '@seriousme/openapi-schema-validator';
import { text } from 'node:stream/consumers';

const validator = new Validator();
const { valid, errors } = await validator.validate(JSON.parse(await text(process.stdin)));
process.stdout.write(JSON.stringify({ valid, version: validator.version, errors: errors ?? [] }));
