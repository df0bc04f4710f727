import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { calculators } from '#shared/workings/index.ts';
import { wiredAnswer } from '#shared/workings/wire.ts';
import type { WorkedAnswer } from '#shared/workings/wire.ts';
import { givenSite } from '#tests/support/site.ts';
import type { Site } from '#tests/support/site.ts';

describe('workings by the API', () => {
  let site: Site;
  beforeAll(async () => {
    site = await givenSite();
  });
  afterAll(() => site.close());

  test.each(calculators.map((calculator) => [calculator.id, calculator] as const))(
    '%s answers as the browser works it out',
    async (id, calculator) => {
      const { body } = await site
        .as(undefined)
        .post(`/api/workings/${id}`)
        .send({ inputs: calculator.initial, units: 'imperial' })
        .expect(200);
      const here = wiredAnswer(
        calculator,
        calculator.work(calculator.schema.parse(calculator.initial)),
        'imperial',
      );
      expect(body).toEqual(JSON.parse(JSON.stringify(here)));
    },
  );

  test('a mistake is named by its field, and so is one that lies between two', async () => {
    const wrong = { ...calculators[0]!.initial, workingPa: -5, flue: 'fitted', flueOutsideMm: 120 };
    const first = await site.as(undefined).post('/api/workings/pressure-by-parts').send({ inputs: wrong });
    expect(first.status).toBe(422);
    expect((first.body as { errors: unknown }).errors).toContainEqual({
      pointer: '#/inputs/workingPa',
      detail: 'Working pressure cannot be less than 0.1 bar (1.45 psi)',
    });
    const second = await site
      .as(undefined)
      .post('/api/workings/pressure-by-parts')
      .send({ inputs: { ...wrong, workingPa: 400_000 } });
    expect((second.body as { errors: unknown }).errors).toEqual([
      { pointer: '#/inputs/flueOutsideMm', detail: 'The flue cannot be as wide as the barrel' },
    ]);
  });

  test('the answer says what it is, in which unit, by which formula, from where', async () => {
    const { body } = await site
      .as(undefined)
      .post('/api/workings/bar-litres')
      .send({ inputs: { workingPa: 500_000, volumeL: 4 } })
      .expect(200);
    const { answers, steps } = body as WorkedAnswer;
    expect(answers[0]).toMatchObject({ value: 20, unit: 'bar·L', text: '20 bar·L' });
    expect(steps[0]?.lines[0]).toMatchObject({
      formula: 'PV = P·V',
      substituted: 'PV = 5 bar × 4 litres = 20 bar·L',
      source: { sureness: 'published' },
    });
  });

  test('every calculator is described, field by field, and in the OpenAPI document too', async () => {
    const { body } = await site.as(undefined).get('/api/workings').expect(200);
    expect((body as { items: { id: string }[] }).items.map(({ id }) => id)).toEqual(
      calculators.map(({ id }) => id),
    );
    const document = (await site.as(undefined).get('/api/openapi.json').expect(200)).body as {
      paths: Record<string, { post?: { requestBody: unknown } }>;
    };
    for (const { id, fields } of calculators) {
      const asked = JSON.stringify(document.paths[`/api/workings/${id}`]?.post?.requestBody);
      for (const name of Object.keys(fields)) expect(asked).toContain(`"${name}"`);
    }
  });
});
