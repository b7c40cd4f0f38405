import { QueryFailedError } from 'typeorm';

import { isDatabaseUnavailable } from '../../../server/database/availability';

const coded = (code: string) => Object.assign(new Error('failed'), { code });

test.each([
  ['nobody listens', coded('ECONNREFUSED')],
  ['the connection broke', coded('ECONNRESET')],
  ['the administrator stops it', coded('57P01')],
  ['it is starting', coded('57P03')],
  ['the connection failed', coded('08006')],
  ['too many connections', coded('53300')],
  ['pg says so in words only', new Error('Connection terminated unexpectedly')],
  ['no connection came free in time', new Error('timeout exceeded when trying to connect')],
  ['every address was tried', Object.assign(new Error(''), { errors: [coded('ECONNREFUSED'), coded('ECONNREFUSED')] })],
  ['TypeORM wraps it', new QueryFailedError('SELECT 1', [], coded('57P01'))],
])('the database is unavailable when %s', (_when, error) => {
  expect(isDatabaseUnavailable(error)).toBe(true);
});

test.each([
  ['a constraint is violated', new QueryFailedError('INSERT', [], coded('23505'))],
  ['a statement is wrong', coded('42601')],
  ['something else failed', new Error('no such thing')],
  ['it is no error at all', 'ECONNREFUSED'],
  ['it is nothing', null],
])('it is not when %s', (_when, error) => {
  expect(isDatabaseUnavailable(error)).toBe(false);
});
