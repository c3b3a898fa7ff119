import type { Accuracy, ArrivalCondition, Chain, Workload } from '@halfpitch/contracts';
import { v7 } from 'uuid';
import { QueueService } from '../src/jobs/queue.service';
import { BootedApp, bootApp, invited, ownerOfNewWorkshop } from './support/app';
import { ownerQuery } from './support/owner-query';
import { Browser, daysAgo, joined, newBike, newChain, newRider } from './support/scene';

let booted: BootedApp;
let owner: Browser;
let workshopId: string;

beforeAll(async () => {
  booted = await bootApp();
  const made = await ownerOfNewWorkshop(booted, 'North Wheel');
  owner = made.browser;
  workshopId = made.session.workshop.id;
});
afterAll(() => booted.close());

const accuracyOf = async (who: Browser): Promise<Accuracy> =>
  (await who.get('/api/accuracy').expect(200)).body;
const fortnight = ({ horizons }: Accuracy) => horizons.find(({ horizon }) => horizon === 'two-weeks')!.score;

type Days = [p10: string, p50: string, p90: string | null];
const window = ([p10, p50, p90]: Days) => ({ p10, p50, p90 });

/** An estimate kept on a day, as the night keeps it. */
async function told(chain: Chain, madeOn: string, lubrication: Days | null, replacement?: Days) {
  const detail = {
    lubrication: lubrication && window(lubrication),
    replacement: replacement ? window(replacement) : { p10: null, p50: null, p90: null },
  };
  await ownerQuery(
    booted,
    `insert into estimate (id, workshop_id, chain_id, made_on, made_at, model_version, share_used, detail)
     values ($1, $2, $3, $4::date, $4::date, 'then', 0.5, $5)`,
    [v7(), workshopId, chain.id, madeOn, JSON.stringify(detail)],
  );
}

/** A chain treated 60 days ago, a window told 30 days ago, and what was found when it came in again. */
async function story(label: string, days: [number, number, number], came: number, arrival: ArrivalCondition) {
  const rider = await newRider(owner, `Rider ${label}`);
  const bike = await newBike(owner, rider.id);
  const chain = await newChain(owner, bike, { label });
  const treat = (day: string, how: ArrivalCondition) =>
    owner.post('/api/treatments').send({ chainId: chain.id, day, kind: 're-wax', arrival: how }).expect(201);
  await treat(daysAgo(60), 'not-seen');
  await told(chain, daysAgo(30), days.map(daysAgo) as Days);
  await treat(daysAgo(came), arrival);
  return chain;
}

it('has nothing to say before anything was judged', async () => {
  const { horizons, kinds, latest } = await accuracyOf(owner);
  expect(horizons.map(({ score }) => score.cases)).toEqual([0, 0, 0]);
  expect([...kinds, ...latest]).toEqual([]);
});

it('holds the windows told before against what was found', async () => {
  await story('held', [15, 9, 3], 8, 'turning');
  await story('sooner', [9, 5, 1], 12, 'turning');
  await story('later', [16, 12, 8], 5, 'quiet');
  await story('open', [16, 12, 8], 10, 'dry');
  await story('unseen', [16, 12, 8], 10, 'not-seen');
  const said = await accuracyOf(owner);
  expect(fortnight(said)).toMatchObject({ cases: 4, held: 1, sooner: 1, later: 1, open: 1 });
  expect(fortnight(said).known).toMatchObject({ n: 2, share: 0.5 });
  expect(said.horizons.find(({ horizon }) => horizon === 'at-treatment')!.score.cases).toBe(0);
  expect(said.kinds).toMatchObject([{ kind: 're-wax', score: { cases: 4 } }]);
  expect(said.latest.map(({ label, verdict, seen }) => [label, verdict, seen])).toEqual([
    ['later', 'later', 'after'],
    ['held', 'held', 'then'],
    ['open', 'open', 'before'],
    ['sooner', 'sooner', 'then'],
  ]);
});

it('takes a chain retired as worn as due by then', async () => {
  const rider = await newRider(owner, 'Rider worn');
  const chain = await newChain(owner, await newBike(owner, rider.id), { label: 'worn' });
  await owner
    .post(`/api/chains/${chain.id}/retire`)
    .send({ day: daysAgo(1), because: 'worn' })
    .expect(200);
  await told(chain, daysAgo(40), null, [daysAgo(-30), daysAgo(-60), null]);
  const { kinds } = await accuracyOf(owner);
  expect(kinds.at(-1)).toMatchObject({ kind: 'replacement', score: { cases: 1, sooner: 1 } });
});

it('is for those who work here', async () => {
  const mechanic = await invited(booted, owner, { name: 'Mo', email: 'mo@north.example', role: 'mechanic' });
  expect(fortnight(await accuracyOf(mechanic)).cases).toBe(4);
  const rider = await newRider(owner, 'Rita Rider');
  await (await joined(booted, owner, rider)).get('/api/accuracy').expect(403);
  const { browser: stranger } = await ownerOfNewWorkshop(booted, 'South Wheel');
  expect(fortnight(await accuracyOf(stranger)).cases).toBe(0);
});

it('learns from reminders when riders come', async () => {
  await booted.app.get(QueueService).idle();
  const { coming: before } = (await owner.get('/api/workload').expect(200)).body as Workload;
  expect(before).toEqual({ chancePerWeek: 0.5, reminders: 0, cameInThreeWeeks: 0 });
  const chains = await ownerQuery<{ id: string; rider: string; label: string }[]>(
    booted,
    'select id, rider_id as rider, label from chain where workshop_id = $1 and label = any($2)',
    [workshopId, ['held', 'later', 'unseen']],
  );
  // One came in the first week, one in the third, one not for four weeks.
  const sent: Record<string, number> = { held: 10, later: 24, unseen: 40 };
  for (const { id, rider, label } of chains) {
    const mail = v7();
    await ownerQuery(
      booted,
      `insert into mail (id, workshop_id, to_address, subject, text, html, state, sent_at)
       values ($1, $2, 'a@b.example', '', '', '', 'sent', now() - $3 * interval '1 day')`,
      [mail, workshopId, sent[label]],
    );
    await ownerQuery(
      booted,
      `insert into reminder (id, workshop_id, chain_id, rider_id, kind, cycle, mail_id)
       values ($1, $2, $3, $4, 'lubrication', 'x', $5)`,
      [v7(), workshopId, id, rider, mail],
    );
  }
  const { coming } = (await owner.get('/api/workload').expect(200)).body as Workload;
  // Prior 2 came, 2 stayed; 0, 2 and 4 weeks of waiting, then three visits: 5 of 13.
  expect(coming.chancePerWeek).toBeCloseTo(5 / 13, 6);
  expect(coming).toMatchObject({ reminders: 2, cameInThreeWeeks: 1 });
});
