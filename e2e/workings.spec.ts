import { expect, expectAccessible, test } from './fixtures.ts';

const calculators = [
  'pressure-by-parts',
  'metal-stress',
  'plates-and-stays',
  'joints',
  'hydraulic-test',
  'pressure-gauge',
  'safety-valve',
  'wall-meter',
  'saturated-steam',
  'evaporation',
  'engine',
  'water-and-feed',
  'steam-balance',
  'gas-jet',
  'bar-litres',
  'due-dates',
  'scale',
  'threads',
  'agreement',
  'distance',
];

for (const [width, colorScheme] of [
  [360, 'dark'],
  [1280, 'light'],
] as const) {
  test(`every calculator reads well by machine, shows no nonsense and never scrolls sideways, ${String(width)} ${colorScheme}`, async ({
    page,
  }) => {
    test.setTimeout(240_000);
    await page.emulateMedia({ colorScheme });
    await page.setViewportSize({ width, height: 800 });
    await page.goto('/workings');
    const listed = page
      .getByRole('main')
      .getByRole('link')
      .filter({ hasNotText: /API|\/api/ });
    await expect(listed).toHaveCount(calculators.length);
    for (const id of calculators) {
      await page.goto(`/workings/${id}`);
      await expect(page.getByRole('heading', { name: 'Figures' })).toBeVisible();
      await expect(page.getByRole('main')).not.toContainText(/NaN|Infinity|undefined|\de[+-]\d/);
      // The page is the same at both widths; the phone's, where things crowd, is the one to read by machine.
      if (width < 400) await expectAccessible(page);
      const overflow = await page.evaluate(
        () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
      );
      expect(overflow, id).toBeLessThanOrEqual(0);
    }
  });
}

test('figures are worked as they are typed, refused beside their field, and kept in the address', async ({
  page,
}) => {
  await page.goto('/workings/pressure-by-parts');
  const answer = page.locator('#answer');
  await expect(answer).toContainText('The barrel governs');
  const wall = page.getByLabel('Wall', { exact: false }).first();
  await wall.fill('1/32');
  await expect(answer).toContainText('That is less than is claimed');
  await wall.fill('0');
  await expect(page.getByText('Wall cannot be less than 0.1 mm (0.003937 in)')).toBeVisible();
  await expect(answer).toContainText('Put right what is marked');
  await wall.fill('3/32');
  await expect(answer).toContainText('The barrel governs');

  // In the other units it is the same boiler.
  await page.getByRole('radio', { name: 'bar, mm' }).check();
  await expect(wall).toHaveValue('2.38');
  const said = await answer.locator('li').first().textContent();

  // The address alone brings it all back.
  const address = page.url();
  expect(address).toContain('barrelWallMm=2.38125');
  await page.goto('/workings');
  await page.goto(address);
  await expect(answer.locator('li').first()).toHaveText(said ?? '');

  // What is not known is left out, and said so.
  await wall.fill('');
  await expect(page.getByText('Cannot say: Measure the wall of the barrel.')).toBeVisible();
  await expect(answer).toContainText('still unknown: barrel');
});

test('a slider is moved by keyboard and the plot has its figures in a table', async ({ page }) => {
  await page.goto('/workings/saturated-steam');
  const temperature = page.locator('#answer').getByText(/°F/).first();
  const before = await temperature.textContent();
  await page.getByRole('slider', { name: 'Working pressure, slide' }).focus();
  await page.keyboard.press('PageUp');
  await expect(temperature).not.toHaveText(before ?? '');
  await page.getByText('The same in figures').click();
  // A row for the heads, and a dozen or so along the curve.
  await expect(page.getByRole('table').getByRole('row').nth(12)).toBeVisible();
});

test('a listing leads to its workings filled in, and says what drives an engine that is kept', async ({
  newPerson,
}) => {
  const page = await newPerson('buyer');
  await page.goto('/account');
  await page.getByRole('button', { name: 'Add an engine' }).click();
  const form = page.getByRole('form', { name: 'Engine' });
  await form.getByRole('button', { name: 'Keep this engine' }).click();
  await expect(form.getByText('Give it a name')).toBeVisible();
  await form.getByLabel('What you call it').fill('Bench oscillator');
  await form.getByLabel('Bore').fill('3/8');
  await form.getByLabel('Stroke', { exact: true }).fill('0.5');
  await form.getByLabel('Speed').fill('250');
  await form.getByLabel('Steam pressure at the engine').fill('30');
  await form.getByRole('button', { name: 'Keep this engine' }).click();
  await expect(page.getByText('Bench oscillator')).toBeVisible();
  await expectAccessible(page);

  await page.goto('/boilers');
  await page.getByRole('link', { name: /Twelve-tube vertical in copper/ }).click();
  const engines = page.getByRole('region', { name: 'Will it drive my engine' });
  await expect(engines.getByRole('listitem').filter({ hasText: 'Bench oscillator' })).toContainText(
    /Drives it|Just drives it|May not keep up|Will not keep up|Cannot say/,
  );
  const implied = page.getByRole('region', { name: 'What the figures imply' });
  const barLitres = implied.getByRole('link', { name: 'Bar·litres: how it is worked out' });
  const figure = await barLitres.textContent();
  await barLitres.click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Bar·litres and the codes');
  await expect(page.locator('#answer')).toContainText(figure?.split(' ')[0] ?? 'no figure');
});
