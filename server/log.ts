import pino, { type Logger } from 'pino';

/** A failed statement carries its parameters, and those are people's data and hashes of secrets. */
const withoutParameters = (error: Error): Record<string, unknown> => {
  const { parameters: _secret, driverError: _same, ...rest } = pino.stdSerializers.err(error) as Record<string, unknown>;
  return rest;
};

/** JSON lines on standard error; standard output stays free for the one line that says where the server is. */
export const createLog = (level: string): Logger => pino({ level, serializers: { err: withoutParameters } }, pino.destination(2));
