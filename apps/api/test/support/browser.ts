import type { TestApp } from './test-app';
import type { TestPerson } from './company';

export interface BrowserAnswer {
  status: number;
  headers: Headers;
  /** The JSON of the answer; null when it has no body. */
  body: Record<string, unknown> & { code?: string };
  text: string;
}

type Credentials = Pick<TestPerson, 'email' | 'password'>;

/** A browser that keeps the cookies it is given and sends what our own pages send. */
export class TestBrowser {
  readonly cookies = new Map<string, string>();

  constructor(private readonly app: Pick<TestApp, 'url'>) {}

  /** Signed in as this person, or an error. */
  static async of(app: Pick<TestApp, 'url'>, person: Credentials): Promise<TestBrowser> {
    const browser = new TestBrowser(app);
    const answer = await browser.signIn(person);
    if (answer.status !== 200) throw new Error(`sign-in answered ${answer.status} ${answer.text}`);
    return browser;
  }

  signIn({ email, password }: Credentials, headers: Record<string, string> = {}): Promise<BrowserAnswer> {
    return this.post('/api/auth/sign-in', { email, password }, headers);
  }

  get(path: string, headers: Record<string, string> = {}): Promise<BrowserAnswer> {
    return this.send('GET', path, headers);
  }

  post(path: string, body: unknown = {}, headers: Record<string, string> = {}): Promise<BrowserAnswer> {
    return this.send('POST', path, { 'Content-Type': 'application/json', ...headers }, JSON.stringify(body));
  }

  /** Any request, with our own header unless it is overruled. Cookies of the answer are kept. */
  async send(
    method: string,
    path: string,
    headers: Record<string, string> = {},
    body?: string,
  ): Promise<BrowserAnswer> {
    const cookie = [...this.cookies].map(([name, value]) => `${name}=${value}`).join('; ');
    const response = await fetch(`${this.app.url}${path}`, {
      method,
      redirect: 'manual',
      headers: { 'X-Rimeward-Request': '1', ...(cookie !== '' && { Cookie: cookie }), ...headers },
      ...(body !== undefined && { body }),
    });
    for (const line of response.headers.getSetCookie()) this.keep(line);
    const text = await response.text();
    const json = response.headers.get('content-type')?.includes('json') ?? false;
    const parsed = json && text !== '' ? (JSON.parse(text) as BrowserAnswer['body']) : {};
    return { status: response.status, headers: response.headers, text, body: parsed };
  }

  /** The same person's browser as it was at this moment: for answers that get lost, and for copied cookies. */
  copy(): TestBrowser {
    const other = new TestBrowser(this.app);
    for (const [name, value] of this.cookies) other.cookies.set(name, value);
    return other;
  }

  private keep(line: string): void {
    const [pair = '', ...attributes] = line.split('; ');
    const [name = '', value = ''] = pair.split('=');
    const expires = attributes.find((one) => one.startsWith('Expires='))?.slice('Expires='.length);
    if (expires !== undefined && new Date(expires) < new Date()) this.cookies.delete(name);
    else this.cookies.set(name, value);
  }
}
