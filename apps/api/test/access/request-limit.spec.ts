import { addCompany } from '../support/company';
import { TestBrowser } from '../support/browser';
import { createTestApp, type TestApp } from '../support/test-app';

describe('the limit of requests', () => {
  let test: TestApp;

  beforeAll(async () => {
    test = await createTestApp({ REQUEST_LIMIT: '40' });
  });

  afterAll(() => test.close());

  it('stops one person who asks too fast, tells him when to come again, and leaves the others alone', async () => {
    const { people } = await addCompany(test.database, 'Clover');
    const eager = await TestBrowser.of(test, people.technician);
    const calm = await TestBrowser.of(test, people.office);
    const answers = await Promise.all(Array.from({ length: 60 }, () => eager.get('/api/auth/session')));
    const stopped = answers.filter(({ status }) => status === 429);
    expect(stopped.length).toBe(20);
    expect(stopped[0]?.body).toMatchObject({ code: 'too-many-requests' });
    expect(Number(stopped[0]?.headers.get('retry-after'))).toBeGreaterThanOrEqual(1);
    expect((await calm.get('/api/auth/session')).status).toBe(200);
  });

  it('counts whoever changes his credentials by his address', async () => {
    const answers = await Promise.all(
      Array.from({ length: 420 }, (_, index) =>
        new TestBrowser(test).get('/api/auth/session', {
          Cookie: `__Host-rw_session=made-up-${index}`,
          'X-Forwarded-For': '10.9.9.9',
        }),
      ),
    );
    expect(answers.filter(({ status }) => status === 429)).toHaveLength(20);
  });
});
