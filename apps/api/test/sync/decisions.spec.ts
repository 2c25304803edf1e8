import { randomUUID } from 'node:crypto';
import type { PullResponse, Review, VisitRecord } from '@rimeward/contracts';
import { crewOfOne, Office } from './office';
import { codeOf, decide, queueItem, reviewed, work } from './reviewed';

let office: Office;
beforeAll(async () => {
  office = await Office.open();
});
afterAll(() => office.close());

describe('deciding on a visit', () => {
  it('sends back with a question, which reaches the phone; the answer moves it; then it is accepted, once', async () => {
    const setting = await reviewed(office);
    const { desk, visit, phone, technician } = setting;
    await work(setting);
    const technicianDesk = await office.desk(technician);
    const start = (await technicianDesk.get<PullResponse>('/sync/pull')).body;
    const question = { id: randomUUID(), text: 'Which zone was the last?', ruleId: null };
    const sent = await decide(desk, visit, { decision: 'sent-back', questions: [question] });
    expect([sent.status, sent.body.number]).toEqual([201, 1]);
    const told = await technicianDesk.get<PullResponse>(
      `/sync/pull?epoch=${start.epoch}&cursor=${start.cursor}`,
    );
    expect(told.body.items).toEqual([{ kind: 'review', review: sent.body }]);
    expect((await queueItem(desk, visit)).standing).toBe('sent-back');

    phone.write(visit, 'question-answered', { questionId: question.id, answer: 'The one at the fence.' });
    await phone.push();
    expect((await queueItem(desk, visit)).standing).toBe('answered');

    expect((await decide(desk, visit, {})).body.number).toBe(2);
    expect((await queueItem(desk, visit)).standing).toBe('accepted');
    expect(codeOf(await decide(desk, visit, {}))).toEqual([409, 'wrong-step']);
  });

  it('opens an accepted visit again when something arrives that nobody has seen', async () => {
    const setting = await reviewed(office);
    await work(setting);
    await decide(setting.desk, setting.visit, {});
    setting.phone.note(setting.visit, 'from the second phone');
    await setting.phone.push();
    expect((await queueItem(setting.desk, setting.visit)).standing).toBe('to-review');
  });

  it('orders a return visit for tomorrow, told to the same people with the reason', async () => {
    const setting = await reviewed(office);
    const { desk, visit, technician } = setting;
    await work(setting);
    const technicianDesk = await office.desk(technician);
    const start = (await technicianDesk.get<PullResponse>('/sync/pull')).body;
    await decide(desk, visit, { decision: 'return-visit', remark: 'Zone 2 was never blown' });
    const told = await technicianDesk.get<PullResponse>(
      `/sync/pull?epoch=${start.epoch}&cursor=${start.cursor}`,
    );
    const planned = told.body.items.find((item) => item.kind === 'visit')?.document;
    expect(planned).toMatchObject({ purpose: 'return-visit', note: 'Zone 2 was never blown' });
    const [day] = await office.rows<{ date: string }>(
      "select ((now() at time zone 'America/Denver')::date + 1)::text as date",
    );
    expect(planned?.date).toBe(day?.date);
    expect(planned?.assigned.map(({ userId }) => userId)).toEqual([technician]);
    expect((await queueItem(desk, visit)).standing).toBe('return-visit');
    expect((await queueItem(desk, planned!.id)).standing).toBe('planned');
  });

  it('refuses what the step does not allow, and says which', async () => {
    const setting = await reviewed(office);
    const { desk, visit, company } = setting;
    expect(codeOf(await decide(desk, visit, {}))).toEqual([409, 'wrong-step']);
    await work(setting);
    expect(codeOf(await decide(desk, visit, { decision: 'sent-back' }))).toEqual([422, 'validation-failed']);
    expect(codeOf(await decide(desk, visit, { seenPosition: 9_999 }))).toEqual([422, 'validation-failed']);
    expect(codeOf(await decide(desk, visit, { expectedNumber: 3 }))).toEqual([409, 'changed-since-opened']);
    const clerk = await office.desk(await office.person(company, 'office'));
    expect((await decide(clerk, visit, {})).status).toBe(403);
  });

  it('lets nobody accept his own work', async () => {
    const crew = await crewOfOne(office);
    const supervisor = await office.person(crew.company, 'supervisor');
    const phone = await office.phone(crew.company, supervisor);
    await work({ ...crew, phone });
    expect(codeOf(await decide(await office.desk(supervisor), crew.visit, {}))).toEqual([403, 'not-allowed']);
  });

  it('lets exactly one of two supervisors win, 200 times', async () => {
    const setting = await reviewed(office);
    const { desk, visit } = setting;
    await work(setting);
    const rival = await office.desk(await office.person(setting.company, 'owner'));
    const { body: record } = await desk.get<VisitRecord>(`/review/visits/${visit}`);
    for (let round = 0; round < 200; round += 1) {
      const request = {
        decision: 'sent-back',
        remark: `round ${round}`,
        questions: [],
        expectedNumber: round,
        seenPosition: record.position,
      };
      const answers = await Promise.all(
        [desk, rival].map((one) => one.post<Review>(`/review/visits/${visit}/decisions`, request)),
      );
      expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
    }
    const numbers = await office.rows<{ number: number }>(
      'select number from visit_reviews where visit_id = $1 order by number',
      [visit],
    );
    expect(numbers.map(({ number }) => number)).toEqual(Array.from({ length: 200 }, (_, n) => n + 1));
  }, 120_000);
});
