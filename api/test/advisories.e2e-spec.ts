import { randomUUID } from 'node:crypto';
import { AdvisoryListItem, AdvisoryView, Problem } from '@brimgate/rules';
import * as v from 'valibot';
import { createTestApp, statementsOf, type TestApp } from './support/app';
import { auditActs } from './support/audit';
import { copies } from './support/copies';
import {
  aContent,
  anOperation,
  aRation,
  current,
  decide,
  inReview,
  type Operation,
  REASON,
  released,
  screened,
  signed,
} from './support/operation';

describe('advisories', () => {
  let test: TestApp;
  let operation: Operation;
  beforeAll(async () => {
    test = await createTestApp();
    operation = await anOperation(test, { name: 'Tamarack <b>Draw</b>', timeZone: 'America/Denver' });
  });
  afterAll(() => test.close());

  async function newestAdvisory(own: Operation): Promise<AdvisoryView> {
    const list = await own.yardManager.agent.get('/api/advisories?limit=1').expect(200);
    const [item] = v.parse(v.array(AdvisoryListItem), (list.body as { items: unknown }).items);
    return v.parse(AdvisoryView, (await own.yardManager.agent.get(`/api/advisories/${item?.id}`).expect(200)).body);
  }

  describe('what one says', () => {
    const conditions = ['South well for these lots', 'Look at the pens twice a day'];
    let advisory: AdvisoryView;
    beforeAll(async () => {
      await released(operation, await signed(operation, { decision: 'concur-with-conditions', conditions }));
      advisory = await newestAdvisory(operation);
    });
    const both = () => [advisory.text, textOfHtml(advisory.html)];

    it('is what to feed, by dry matter and as it is weighed', () => {
      // 79 % of 10.65 kg of dry matter is 8.41 kg; at 89 % dry matter that is 9.453 kg as fed.
      for (const body of both())
        expect(body).toMatch(/Corn[^\n]*: 9\.5 kg as fed \(79 % of dry matter\)|Corn[^\n]*9\.5 kg 79/);
    });

    it('stands before everything else', () => {
      for (const body of both()) {
        const places = ['What to feed, a head and day', 'What was found', 'What to watch for', 'Within their limits'];
        const found = places.map((heading) => body.search(new RegExp(heading, 'i')));
        expect(found).toEqual([...found].sort((one, other) => one - other));
        expect(found[0]).toBeGreaterThan(0);
      }
    });

    it('is for which cattle and which water', () => {
      for (const body of both()) {
        expect(body).toContain('to finishing steers of 454 kg, fed from 338 to 554 kg');
        expect(body).toMatch(/Well \d+[^\n]*2,000 mg\/L as SO4/);
      }
    });

    it('is what was found, on which figures and limit, with where the limit comes from', () => {
      for (const body of both()) {
        expect(body).toMatch(/Total sulfur: over/);
        expect(body).toMatch(
          /Value 0\.48 % of DM, limit 0\.3 % of DM\. The limit is published: Mineral Tolerance of Animals/,
        );
      }
    });

    it('is what is within its limits too, in a table', () => {
      for (const body of both()) {
        expect(body).toMatch(/Within their limits, on the figures given/i);
        expect(body).toMatch(/Calcium to phosphorus\W+3\.24:1\W+(limit )?at least 1:1[\s(]+published: /);
      }
    });

    it('is what to watch for, and that the herd’s veterinarian and local rules decide', () => {
      for (const body of both()) {
        expect(body).toContain('Signs of polioencephalomalacia');
        expect(body).toContain('Change of diet');
        expect(body).toContain('A screening aid, not veterinary or legal advice');
        expect(body.replace(/\s+/g, ' ')).toContain(
          "The herd's veterinarian and the local nutrient-management rules decide",
        );
      }
    });

    it('is what the veterinarian signed, with the conditions and the moment on the yard’s clock', () => {
      const { name, licence } = operation.veterinarian.person;
      for (const body of both()) {
        expect(body).toMatch(/Feed it only under these conditions/i);
        for (const condition of conditions) expect(body).toContain(condition);
        expect(body).toMatch(new RegExp(`${name}, ${licence}, \\d+ \\w+ \\d{4} \\d\\d:\\d\\d \\(America/Denver\\)`));
        expect(body).toContain(REASON);
      }
    });

    it('names the content that was signed, and where to read it', () => {
      for (const body of both()) expect(body).toMatch(/\b[0-9a-f]{64}\b/);
      expect(advisory.text).toContain(`http://127.0.0.1:3000/advisories/${advisory.id}`);
      expect(advisory.html).toContain(`href="http://127.0.0.1:3000/advisories/${advisory.id}"`);
    });

    it('never says safe, and names no drug and no dose', () => {
      for (const body of both()) expect(body).not.toMatch(/\bsafe(ly)?\b|thiamin|vitamin B1|\bmg\/kg body/i);
    });

    it('shows what people typed as they typed it, and nothing of it as markup', () => {
      expect(advisory.html).toContain('Tamarack &lt;b&gt;Draw&lt;/b&gt;');
      expect(advisory.html).not.toContain('<b>Draw');
      expect(advisory.text).toContain('Tamarack <b>Draw</b>');
      expect(advisory.subject).toContain('Tamarack <b>Draw</b>');
    });

    it('reads without pictures, scripts or anything from elsewhere', () => {
      expect(advisory.html).not.toMatch(/<img|<script|<link|<iframe|url\(|src=/i);
    });
  });

  it.each(['{{contentHash}}', '${1+1}', '<%= 1 %>', '{{{html}}}', '{{> feeding}}'])(
    'takes %s in a name for what it is',
    async (name) => {
      const own = await anOperation(test);
      const ration = await aRation(own, `Finisher ${name}`);
      await released(own, await screened(own, aContent(own.waters.sweet), ration));
      const { text, subject } = await newestAdvisory(own);
      expect(text).toContain(`Finisher ${name}`);
      expect(subject).toContain(`Finisher ${name}`);
    },
  );

  it('has a subject of one line, whatever a name holds', async () => {
    const own = await anOperation(test);
    const ration = await aRation(own, 'Finisher\r\nBcc: everybody@yards.example');
    await released(own, await screened(own, aContent(own.waters.sweet), ration));
    const { subject } = await newestAdvisory(own);
    expect(subject).toContain('Finisher Bcc: everybody@yards.example');
    expect(subject).not.toMatch(/[\r\n]/);
  });

  it('says what is not determined, and why', async () => {
    const own = await anOperation(test);
    const content = aContent(own.waters.sweet, { waters: [], waterIntake: null });
    await released(own, await signedContent(own, content));
    const { text, html } = await newestAdvisory(own);
    for (const body of [text, textOfHtml(html)]) {
      expect(body).toMatch(/what is not determined/i);
      expect(body).toMatch(/(Total sulfur:|drinking water together is) not determined/);
      expect(body).toContain('No water was named');
    }
  });

  it('warns of urea when urea is fed, and not otherwise', async () => {
    const own = await anOperation(test);
    await released(own, await screened(own, aContent(own.waters.sweet)));
    expect((await newestAdvisory(own)).text).not.toContain('Urea poisoning');
    const content = aContent(own.waters.sweet, {
      lines: [
        { feedstuffId: 'corn-grain-dry-rolled', sharePctDm: 87.5 },
        { feedstuffId: 'alfalfa-hay-early-bloom', sharePctDm: 10 },
        { feedstuffId: 'limestone', sharePctDm: 2 },
        { feedstuffId: 'urea-feed-grade-45n', sharePctDm: 0.5 },
      ],
    });
    await released(own, await screened(own, content));
    expect((await newestAdvisory(own)).text).toContain('Urea poisoning');
  });

  describe('acknowledging one', () => {
    const acknowledge = (own: Operation, id: string, key: string = randomUUID()) =>
      own.yardManager.agent.post(`/api/advisories/${id}/acknowledgement`).set('Idempotency-Key', key);

    it('says who and when, once, in the audit trail too', async () => {
      await released(operation);
      const { id } = await newestAdvisory(operation);
      const key = randomUUID();
      const first = await acknowledge(operation, id, key).expect(200);
      const read = v.parse(AdvisoryView, first.body);
      expect(read.acknowledgedBy).toBe(operation.yardManager.person.name);
      expect(read.acknowledgedAt).not.toBeNull();
      expect((await acknowledge(operation, id, key).expect(200)).body).toEqual(first.body);
      const again = await acknowledge(operation, id).expect(409);
      expect(v.parse(Problem, again.body).code).toBe('already-acknowledged');
      expect(await auditActs(operation, id)).toEqual(['advisory-acknowledged']);
      await operation.yardManager.agent.post(`/api/advisories/${id}/acknowledgement`).expect(400);
    });
  });

  it('lists fifty in as many statements as five, without their bodies', async () => {
    const own = await anOperation(test);
    const read = () => own.yardManager.agent.get('/api/advisories?limit=100').expect(200);
    for (let count = 0; count < 5; count += 1) await released(own);
    const few = await statementsOf(test.sequelize, read);
    await copies('advisories', { firmId: own.firm.id, count: 45, changes: { release_id: '-seq' } });
    const many = await statementsOf(test.sequelize, read);
    expect(many).toHaveLength(few.length);
    expect(many.join(' ')).not.toMatch(/`html`/);
  });

  async function signedContent(own: Operation, content: ReturnType<typeof aContent>) {
    const ration = await inReview(own, content);
    await decide(own.veterinarian.agent, ration).expect(201);
    return current(own, ration);
  }
});

/** HTML as a reader sees it: a line for each row or paragraph. */
function textOfHtml(html: string): string {
  return html
    .replace(/<style>[\s\S]*?<\/style>/g, '')
    .replace(/\s*\n\s*/g, ' ')
    .replace(/<\/(tr|p|h1|h2|li|div)>/g, '\n')
    .replace(/<[^>]+>/g, ' ')
    .replace(/&#x27;/g, "'")
    .replace(/&quot;/g, '"')
    .replace(/&lt;/g, '<')
    .replace(/&gt;/g, '>')
    .replace(/&#x3D;/g, '=')
    .replace(/&nbsp;/g, ' ')
    .replace(/&amp;/g, '&')
    .replace(/[ \t]+/g, ' ')
    .replace(/ ([,.;:])/g, '$1');
}
