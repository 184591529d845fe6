import { randomUUID } from 'node:crypto';
import { AdvisoryView } from '@brimgate/rules';
import * as v from 'valibot';
import { AdvisoryModel } from '../src/advisories/advisory.model';
import { LAST_TRY } from '../src/outbox/delivery-failure';
import { MailTransport } from '../src/outbox/mail-transport';
import { OutboxClaims } from '../src/outbox/outbox-claims.service';
import { OutboxMailModel } from '../src/outbox/outbox-mail.model';
import { OutboxSender } from '../src/outbox/outbox-sender.service';
import { createTestApp, type TestApp } from './support/app';
import { ownerConnection } from './support/database';
import { Mailbox } from './support/mailbox';
import { anOperation, type Operation, released } from './support/operation';

describe('the outbox', () => {
  let test: TestApp;
  let operation: Operation;
  let claims: OutboxClaims;
  const mailbox = new Mailbox();
  const owner = ownerConnection();

  beforeAll(async () => {
    test = await createTestApp();
    operation = await anOperation(test);
    claims = new OutboxClaims(test.sequelize);
    await mailbox.open();
  });
  afterAll(async () => {
    await mailbox.close();
    await test.close();
    await owner.close();
  });
  beforeEach(async () => {
    await owner.query('DELETE FROM outbox_mails');
    mailbox.empty();
  });

  const server = () => ({ host: '127.0.0.1', port: mailbox.port, secure: false, user: '', password: '' });
  const aSender = () => new OutboxSender(claims, new MailTransport(server()));
  const firmId = () => operation.firm.id;
  const theMail = async () => {
    const [row] = await OutboxMailModel.findAll({ where: { firmId: firmId() } });
    if (!row) throw new Error('No mail in the outbox');
    return row;
  };
  const makeDue = () =>
    owner.query("UPDATE outbox_mails SET due_at = UTC_TIMESTAMP(3) WHERE state IN ('waiting', 'sending')");

  /** Releases a ration, so that one mail to the yard stands in the outbox. */
  async function aQueuedMail(): Promise<void> {
    await released(operation);
  }

  async function queueMore(count: number): Promise<void> {
    const row = await theMail();
    await OutboxMailModel.bulkCreate(
      Array.from({ length: count }, (_, index) => ({
        firmId: row.firmId,
        uuid: randomUUID(),
        advisoryId: row.advisoryId,
        recipient: `pen-${index}@yards.example`,
        role: 'yard',
        messageId: `<${randomUUID()}@brimgate.example>`,
        state: 'queued',
        attempts: 0,
        dueAt: new Date(),
      })),
    );
  }

  it('sends what was frozen at release, as HTML and as text, under the frozen Message-ID', async () => {
    await aQueuedMail();
    const row = await theMail();
    const advisory = await AdvisoryModel.findOne({ where: { firmId: firmId(), id: row.advisoryId } });
    expect(await aSender().sendDue()).toBe(1);
    const [mail] = mailbox.mails;
    expect(mail?.messageId).toBe(row.messageId);
    expect(mail?.subject).toBe(advisory?.subject);
    expect(mail?.text?.trim()).toBe(advisory?.text.trim());
    expect(String(mail?.html).trim()).toBe(advisory?.html.trim());
    expect(mail?.headers.get('auto-submitted')).toBe('auto-generated');
    expect([mail?.to].flat()[0]?.text).toBe(operation.yard.advisoryEmail);
    const sent = await theMail();
    expect(sent).toMatchObject({ state: 'sent', attempts: 1, lastError: null, dueAt: null });
    expect(sent.sentAt).not.toBeNull();
  });

  it('sends nothing twice', async () => {
    await aQueuedMail();
    await aSender().sendDue();
    expect(await aSender().sendDue()).toBe(0);
    expect(mailbox.mails).toHaveLength(1);
  });

  it('loses nothing while the server is down, and sends when it is up again', async () => {
    await aQueuedMail();
    await mailbox.close();
    await aSender().sendDue(stopAfterOne());
    const waiting = await theMail();
    expect(waiting).toMatchObject({ state: 'waiting', attempts: 1 });
    expect(waiting.lastError).toMatch(/ECONNREFUSED/);
    await mailbox.open();
    await makeDue();
    await aSender().sendDue();
    expect(mailbox.mails).toHaveLength(1);
    expect((await theMail()).state).toBe('sent');
  });

  it('waits longer after each failure', async () => {
    await aQueuedMail();
    await mailbox.close();
    await owner.query('UPDATE outbox_mails SET attempts = 19');
    await aSender().sendDue(stopAfterOne());
    const { dueAt } = await theMail();
    // 10 ms doubled 19 times would be an hour and a half: an hour is the longest, half of it the least.
    const waitMinutes = ((dueAt?.getTime() ?? 0) - Date.now()) / 60_000;
    expect(waitMinutes).toBeGreaterThan(29);
    expect(waitMinutes).toBeLessThanOrEqual(60.1);
    await mailbox.open();
  });

  it('tries again after a 451 and is then accepted', async () => {
    await aQueuedMail();
    mailbox.recipientRefusals.push({ code: 451, message: 'Greylisted, come back later' });
    await aSender().sendDue(stopAfterOne());
    const waiting = await theMail();
    expect(waiting.state).toBe('waiting');
    expect(waiting.lastError).toContain('Greylisted');
    await makeDue();
    await aSender().sendDue();
    expect(await theMail()).toMatchObject({ state: 'sent', attempts: 2, lastError: null });
    expect(mailbox.mails).toHaveLength(1);
  });

  it.each([
    ['recipient', () => mailbox.recipientRefusals],
    ['message', () => mailbox.messageRefusals],
  ])('parks a mail whose %s is refused for good, with what the server said', async (_, refusals) => {
    await aQueuedMail();
    refusals().push({ code: 550, message: 'No such mailbox here' });
    await aSender().sendDue();
    const parked = await theMail();
    expect(parked).toMatchObject({ state: 'parked', attempts: 1, dueAt: null });
    expect(parked.lastError).toContain('No such mailbox here');
    expect(await aSender().sendDue()).toBe(0);
    expect(mailbox.mails).toHaveLength(0);
  });

  it('parks after the last try and says how many there were', async () => {
    await aQueuedMail();
    await owner.query(`UPDATE outbox_mails SET attempts = ${LAST_TRY - 1}`);
    mailbox.recipientRefusals.push({ code: 451, message: 'Later' });
    await aSender().sendDue();
    const parked = await theMail();
    expect(parked.state).toBe('parked');
    expect(parked.lastError).toMatch(new RegExp(`^Gave up after ${LAST_TRY} tries: .*Later`));
  });

  it('sends each mail once with several senders at work', async () => {
    await aQueuedMail();
    await queueMore(39);
    const taken = await Promise.all(Array.from({ length: 4 }, () => drain(aSender())));
    expect(taken.reduce((sum, count) => sum + count, 0)).toBe(40);
    const ids = mailbox.mails.map((mail) => mail.messageId);
    expect(ids).toHaveLength(40);
    expect(new Set(ids).size).toBe(40);
  });

  /** A sender may find every row locked for a moment; it looks again as the poller does. */
  async function drain(sender: OutboxSender): Promise<number> {
    let taken = 0;
    const undone = () => OutboxMailModel.count({ where: { firmId: firmId(), state: ['queued', 'waiting'] } });
    while ((await undone()) > 0) taken += await sender.sendDue();
    return taken;
  }

  it('sends a claimed mail again after its sender died, under the same Message-ID', async () => {
    await aQueuedMail();
    const { messageId } = await theMail();
    const claim = await claims.claimNext();
    expect(claim?.messageId).toBe(messageId);
    expect(await aSender().sendDue()).toBe(0);
    await makeDue();
    expect(await aSender().sendDue()).toBe(1);
    expect(mailbox.mails.map((mail) => mail.messageId)).toEqual([messageId]);
  });

  it('does not let a sender whose lease ran out mark what another has taken up', async () => {
    await aQueuedMail();
    const late = await claims.claimNext();
    await makeDue();
    await claims.claimNext();
    if (late) await claims.markParked(late, 'said too late');
    expect(await theMail()).toMatchObject({ state: 'sending', lastError: null });
  });

  it('stops between two mails when told so', async () => {
    await aQueuedMail();
    await queueMore(3);
    expect(await aSender().sendDue(stopAfterOne())).toBe(1);
    expect(mailbox.mails).toHaveLength(1);
  });

  it.each(['yard@yards.example\r\nBcc: everybody@yards.example', 'yard@yards.example\nX-Evil: 1'])(
    'refuses an address with a line break in it (%j)',
    async (recipient) => {
      await aQueuedMail();
      await OutboxMailModel.update({ recipient }, { where: { firmId: firmId() } });
      await aSender().sendDue();
      const parked = await theMail();
      expect(parked.state).toBe('parked');
      expect(parked.lastError).toMatch(/line break/);
      expect(mailbox.mails).toHaveLength(0);
    },
  );

  describe('trying a parked mail again', () => {
    async function aParkedAdvisory(): Promise<AdvisoryView> {
      await aQueuedMail();
      mailbox.recipientRefusals.push({ code: 550, message: 'Mailbox full for good' });
      await aSender().sendDue();
      const list = await operation.nutritionist.agent.get('/api/advisories?limit=1').expect(200);
      const [item] = (list.body as { items: { id: string }[] }).items;
      const view = await operation.nutritionist.agent.get(`/api/advisories/${item?.id}`).expect(200);
      return v.parse(AdvisoryView, view.body);
    }

    const retry = (advisory: AdvisoryView, agent = operation.nutritionist.agent, key: string = randomUUID()) =>
      agent
        .post(`/api/advisories/${advisory.id}/deliveries/${advisory.deliveries[0]?.id}/retry`)
        .set('Idempotency-Key', key);

    it('queues it, and it goes out under the Message-ID it had', async () => {
      const advisory = await aParkedAdvisory();
      const { messageId } = await theMail();
      expect(advisory.deliveries[0]).toMatchObject({ state: 'parked', attempts: 1 });
      const answer = v.parse(AdvisoryView, (await retry(advisory).expect(200)).body);
      expect(answer.deliveries[0]).toMatchObject({ state: 'queued', attempts: 0 });
      await aSender().sendDue();
      expect(mailbox.mails.map((mail) => mail.messageId)).toEqual([messageId]);
    });

    it('is refused for a mail that is not parked', async () => {
      const advisory = await aParkedAdvisory();
      await retry(advisory).expect(200);
      const response = await retry(advisory).expect(409);
      expect((response.body as { code: string }).code).toBe('delivery-not-parked');
    });

    it('is done once for a key', async () => {
      const advisory = await aParkedAdvisory();
      const key = randomUUID();
      const first = await retry(advisory, undefined, key).expect(200);
      const second = await retry(advisory, undefined, key).expect(200);
      expect(second.body).toEqual(first.body);
    });

    it('is for the nutritionist and the administrator', async () => {
      const advisory = await aParkedAdvisory();
      await retry(advisory, operation.veterinarian.agent).expect(403);
      await retry(advisory, operation.administrator.agent).expect(200);
    });

    it('needs an Idempotency-Key', async () => {
      const advisory = await aParkedAdvisory();
      const path = `/api/advisories/${advisory.id}/deliveries/${advisory.deliveries[0]?.id}/retry`;
      await operation.nutritionist.agent.post(path).expect(400);
    });
  });
});

/** Says stop after the first mail. */
function stopAfterOne(): () => boolean {
  let asked = 0;
  return () => (asked += 1) > 1;
}
