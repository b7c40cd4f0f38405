import { Passwords, UNKNOWN_ACCOUNT } from '../../../server/sessions/passwords';
import { delayAfter } from '../../../server/sessions/sign-in-limit';

describe('the delay after a failed attempt', () => {
  test('begins with the tenth, doubles, and stops at a quarter of an hour', () => {
    const delays = [1, 9, 10, 11, 12, 13, 14, 15, 16, 1000].map(delayAfter);
    expect(delays).toEqual([0, 0, 30, 60, 120, 240, 480, 900, 900, 900]);
  });
});

describe('passwords', () => {
  const passwords = new Passwords();
  afterAll(() => passwords.close());
  const costOf = (hash: string) => hash.split('$').slice(1, 3);

  test('the hash for unknown accounts costs as much as a real one, so that both take as long', async () => {
    expect(costOf(UNKNOWN_ACCOUNT)).toEqual(costOf(await passwords.hash('any')));
  });

  test('no password opens an account that does not exist', async () => {
    expect(await passwords.matches('', null)).toBe(false);
  });

  test.each([
    ['of 72 bytes', 'x'.repeat(72)],
    ['of 73 bytes', 'x'.repeat(73)],
    ['of 256 characters of four bytes each', '🔌'.repeat(256)],
  ])('one %s counts to its last character', async (_what, password) => {
    const hash = await passwords.hash(password);
    expect(await passwords.matches(password, hash)).toBe(true);
    expect(await passwords.matches(`${password.slice(0, -2)}yy`, hash)).toBe(false);
    expect(await passwords.matches(`${password}x`, hash)).toBe(false);
  });

  test('two hashes of one password differ', async () => {
    expect(await passwords.hash('same')).not.toBe(await passwords.hash('same'));
  });
});
