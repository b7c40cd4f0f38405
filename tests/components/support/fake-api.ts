import { connection } from '@/hooks/api/connection';

interface Asked {
  method: string;
  path: string;
  body: unknown;
}
type Answer = (asked: Asked) => { status?: number; body?: unknown } | Promise<{ status?: number; body?: unknown }>;

/** Stands in for the server behind `fetch`: answers by method and path, and keeps what it was asked. */
export class FakeApi {
  readonly asked: Asked[] = [];
  /** No answer comes while this is set, as without a network. */
  away = false;
  readonly #answers = new Map<string, Answer>();

  on(route: `${'GET' | 'POST' | 'PUT' | 'DELETE'} ${string}`, answer: Answer): this {
    this.#answers.set(route, answer);
    return this;
  }

  of(route: string): Asked[] {
    return this.asked.filter(({ method, path }) => `${method} ${path}` === route);
  }

  readonly fetch = async (input: RequestInfo | URL, init: RequestInit = {}): Promise<Response> => {
    if (this.away) throw new TypeError('Failed to fetch');
    const method = init.method ?? 'GET';
    const path = String(input);
    const asked = { method, path, body: typeof init.body === 'string' ? (JSON.parse(init.body) as unknown) : undefined };
    this.asked.push(asked);
    const answer = this.#answers.get(`${method} ${path}`) ?? this.#answers.get(`${method} ${path.split('?')[0]}`);
    const { status = 200, body } = answer ? await answer(asked) : { status: 404, body: { code: 'not-found', instance: 'urn:uuid:0' } };
    return { ok: status < 400, status, json: async () => body } as Response;
  };
}

const realFetch = globalThis.fetch;

export const useFakeApi = (): FakeApi => {
  const api = new FakeApi();
  globalThis.fetch = api.fetch as typeof fetch;
  return api;
};

export const restoreFetch = () => {
  globalThis.fetch = realFetch;
  connection.answered();
};

/** A browser's store, kept in memory. */
export const fakeStore = (): Map<string, string> => {
  const kept = new Map<string, string>();
  const store: Partial<Storage> = {
    getItem: (key) => kept.get(key) ?? null,
    setItem: (key, value) => void kept.set(key, value),
    removeItem: (key) => void kept.delete(key),
  };
  Object.defineProperty(globalThis, 'localStorage', { value: store, configurable: true });
  return kept;
};
