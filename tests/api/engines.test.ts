import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { mostEngines } from '#shared/engines/contract.ts';
import type { Engine } from '#shared/engines/contract.ts';
import { anEngine } from '#tests/support/engines.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site, TestPerson } from '#tests/support/site.ts';

describe('engines a member keeps', () => {
  let site: Site;
  let owner: TestPerson;
  let stranger: TestPerson;
  beforeAll(async () => {
    site = await givenSite();
    owner = await site.givenPerson('Ada Venn');
    stranger = await site.givenPerson('Bert Stowe');
  });
  afterAll(() => site.close());

  const kept = async (person: TestPerson): Promise<Engine[]> =>
    ((await site.as(person).get('/api/engines').expect(200)).body as { items: Engine[] }).items;

  test('are listed in the order they were kept, changed, and forgotten', async () => {
    const first = await site.as(owner).post('/api/engines').send(anEngine).expect(201);
    site.clock.pass(1_000);
    await site
      .as(owner)
      .post('/api/engines')
      .send({ ...anEngine, name: 'Mill engine' })
      .expect(201);
    const { id } = first.body as Engine;
    await site
      .as(owner)
      .put(`/api/engines/${id}`)
      .send({ ...anEngine, name: 'Twin, linered', boreMm: 18 })
      .expect(200);
    expect((await kept(owner)).map(({ name, boreMm }) => [name, boreMm])).toEqual([
      ['Twin, linered', 18],
      ['Mill engine', 19.05],
    ]);
    await site.as(owner).delete(`/api/engines/${id}`).expect(200);
    expect((await kept(owner)).map(({ name }) => name)).toEqual(['Mill engine']);
    await site.as(owner).delete(`/api/engines/${id}`).expect(404);
  });

  test('are nobody else’s to see, change or forget', async () => {
    const [mine] = await kept(owner);
    expect(await kept(stranger)).toEqual([]);
    await site.as(stranger).put(`/api/engines/${mine!.id}`).send(anEngine).expect(404);
    await site.as(stranger).delete(`/api/engines/${mine!.id}`).expect(404);
    expect(await kept(owner)).toEqual([mine]);
  });

  test('a figure that cannot be is named beside its field', async () => {
    const { status, body } = await site
      .as(owner)
      .post('/api/engines')
      .send({ ...anEngine, boreMm: 0, cutOffPercent: 120, name: ' ' });
    expect(status).toBe(422);
    expect((body as { errors: unknown }).errors).toEqual(
      expect.arrayContaining([
        { pointer: '#/boreMm', detail: 'A bore is at least 2 mm' },
        { pointer: '#/cutOffPercent', detail: 'A cut-off is at most 100 % of the stroke' },
        { pointer: '#/name', detail: 'Give it a name' },
      ]),
    );
  });

  test('are so many and no more, however many are sent at once', async () => {
    await Promise.all(
      Array.from({ length: mostEngines + 4 }, () => site.as(stranger).post('/api/engines').send(anEngine)),
    );
    expect(await kept(stranger)).toHaveLength(mostEngines);
    const { status, body } = await site.as(stranger).post('/api/engines').send(anEngine);
    expect(status).toBe(409);
    expect((body as { detail: string }).detail).toContain('remove one to keep another');
  });
});
