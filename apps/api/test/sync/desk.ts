import { password } from './seed';
import type { Answer } from './test-phone';

/** A person who has signed in, as the API sees a browser: cookies and our own header. */
export class Desk {
  private constructor(
    private readonly url: string,
    private readonly cookie: string,
  ) {}

  static async signIn(url: string, email: string): Promise<Desk> {
    const answer = await fetch(`${url}/api/auth/sign-in`, {
      method: 'POST',
      headers: { 'content-type': 'application/json', 'x-rimeward-request': '1' },
      body: JSON.stringify({ email, password }),
    });
    if (!answer.ok) throw new Error(`sign-in failed: ${answer.status} ${await answer.text()}`);
    const cookie = answer.headers.getSetCookie().map((one) => one.split(';')[0]);
    return new Desk(url, cookie.join('; '));
  }

  raw(path: string, init: RequestInit = {}): Promise<Response> {
    return fetch(`${this.url}/api${path}`, {
      ...init,
      headers: { cookie: this.cookie, 'x-rimeward-request': '1', ...(init.headers as object) },
    });
  }

  async get<T>(path: string): Promise<Answer<T>> {
    return readJson<T>(await this.raw(path));
  }

  async post<T>(path: string, body: unknown): Promise<Answer<T>> {
    const headers = { 'content-type': 'application/json' };
    return readJson<T>(await this.raw(path, { method: 'POST', headers, body: JSON.stringify(body) }));
  }
}

async function readJson<T>(answer: Response): Promise<Answer<T>> {
  const text = await answer.text();
  return { status: answer.status, body: (text === '' ? null : JSON.parse(text)) as T };
}
