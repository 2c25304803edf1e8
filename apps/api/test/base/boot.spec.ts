import { createTestApp, type TestApp } from '../support/test-app';

let test: TestApp;
beforeAll(async () => {
  test = await createTestApp();
});
afterAll(() => test.close());

it('answers health once the database answers', async () => {
  const response = await fetch(`${test.url}/api/health`);
  expect(response.status).toBe(200);
  expect(await response.json()).toEqual({ status: 'ok' });
});

it('answers problem details for an address that does not exist', async () => {
  const response = await fetch(`${test.url}/api/nothing-here`);
  expect(response.status).toBe(404);
  expect(response.headers.get('content-type')).toContain('application/problem+json');
  expect(await response.json()).toMatchObject({ code: 'not-found', status: 404 });
});
