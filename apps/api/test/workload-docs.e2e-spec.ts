import type { Workload } from '@halfpitch/contracts';
import type { OpenAPIObject } from '@nestjs/swagger';
import { QueueService } from '../src/jobs/queue.service';
import { BootedApp, bootApp, invited, ownerOfNewWorkshop } from './support/app';
import { Browser, daysAgo, newBike, newChain, newRide, newRider } from './support/scene';

let booted: BootedApp;
let owner: Browser;

beforeAll(async () => {
  booted = await bootApp();
  ({ browser: owner } = await ownerOfNewWorkshop(booted, 'North Wheel'));
});
afterAll(() => booted.close());

const workloadOf = async (who: Browser): Promise<Workload> =>
  (await who.get('/api/workload').expect(200)).body;

describe('GET /api/workload', () => {
  it('is twelve calendar weeks of nothing where there are no chains', async () => {
    const { weeks, minutesPerWeek } = await workloadOf(owner);
    expect(minutesPerWeek).toBe(1200);
    expect(weeks).toHaveLength(12);
    expect(weeks.every(({ from }) => new Date(from).getUTCDay() === 1)).toBe(true);
    expect(weeks[0]!.from <= daysAgo(0) && daysAgo(0) <= weeks[0]!.to).toBe(true);
    expect(weeks[3]).toMatchObject({ treatments: { p90: 0, mean: 0 }, potLoads: { p90: 0 }, chains: [] });
  });

  it('shows a spent chain in this week, with its minutes and its place in the pot', async () => {
    const rider = await newRider(owner, 'Rita Rider');
    const bike = await newBike(owner, rider.id);
    const chain = await newChain(owner, bike);
    await newRide(owner, bike.id, { distanceM: 1_500_000, day: daysAgo(90) });
    await booted.app.get(QueueService).idle();
    const { weeks, coming } = await workloadOf(owner);
    const mine = weeks[0]!.chains.find(({ chainId, kind }) => chainId === chain.id && kind === 'lubrication');
    expect(mine).toMatchObject({ label: 'A', riderName: 'Rita Rider' });
    expect(mine!.chance).toBeGreaterThan(0.9);
    expect(weeks[0]).toMatchObject({
      treatments: { p90: 1 },
      benchMinutes: { p90: 25 },
      potLoads: { p90: 1 },
    });
    // Nobody was written to yet: even odds that who is due comes within a week.
    expect(coming).toEqual({ chancePerWeek: 0.5, reminders: 0, cameInThreeWeeks: 0 });
    expect(weeks[0]!.treatments.mean).toBeCloseTo(mine!.chance / 2, 6);
  });

  it('is the owner’s, and of their workshop', async () => {
    const desk = await invited(booted, owner, { name: 'Dee Desk', email: 'dee@north.example', role: 'desk' });
    await desk.get('/api/workload').expect(403);
    const { browser: stranger } = await ownerOfNewWorkshop(booted, 'South Wheel');
    expect((await workloadOf(stranger)).weeks.flatMap(({ chains }) => chains)).toEqual([]);
  });
});

describe('/api/docs', () => {
  /** Every route that the program answers, as the document writes them. */
  const routes = () => {
    const stack = (booted.app.getHttpAdapter().getInstance() as ExpressLike).router.stack;
    return stack
      .flatMap(({ route }) => (route ? [route] : []))
      .flatMap(({ path, methods }) => Object.keys(methods).map((method) => ({ method, path })))
      .filter(
        ({ method, path }) => path.startsWith('/api/') && !path.startsWith('/api/docs') && method !== '_all',
      )
      .map(({ method, path }) => ({ method, path: path.replace(/:(\w+)/g, '{$1}') }));
  };
  interface ExpressLike {
    router: { stack: { route?: { path: string; methods: Record<string, boolean> } }[] };
  }

  it('lists every route with what it takes and what it answers', async () => {
    const document: OpenAPIObject = (await booted.browser().get('/api/docs/openapi.json').expect(200)).body;
    expect(routes().length).toBeGreaterThan(40);
    for (const { method, path } of routes()) {
      const operation = document.paths[path]?.[method as 'get'];
      expect([method, path, Boolean(operation)]).toEqual([method, path, true]);
      const good = Object.entries(operation!.responses ?? {}).find(([status]) => status.startsWith('2'))?.[1];
      if (path.startsWith('/api/health') || path.startsWith('/api/ready')) continue;
      expect([method, path, JSON.stringify(good ?? null)]).toEqual([
        method,
        path,
        expect.stringContaining('"schema"'),
      ]);
    }
    const send = document.paths['/api/reminders']?.post;
    expect(JSON.stringify(send?.requestBody)).toContain('chainId');
    expect(JSON.stringify(document.paths['/api/chains/{id}/estimate']?.get?.responses)).toContain('dryness');
  });

  it('can be browsed, with everything it needs from this address', async () => {
    const page = await booted.browser().get('/api/docs').redirects(1).expect(200);
    expect(page.type).toBe('text/html');
    const needed = [...page.text.matchAll(/(?:src|href)="([^"]+)"/g)].map(([, url]) => url!);
    expect(needed.length).toBeGreaterThan(2);
    for (const url of needed) {
      const { pathname, host } = new URL(url, 'http://here.example/api/');
      expect(host).toBe('here.example');
      await booted.browser().get(pathname).expect(200);
    }
    expect(page.text).not.toMatch(/<script(?![^>]*\bsrc=)[^>]*>\s*\S/);
  });
});
