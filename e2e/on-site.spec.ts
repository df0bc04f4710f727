import { expect, expectAccessible, test } from './fixtures.ts';

test('a hydraulic test is raised by quarters and held by a clock that outlives a reload', async ({
  newPerson,
}) => {
  test.setTimeout(120_000);
  const page = await newPerson('surveyor', { isPhone: true });
  await page.clock.install();
  const examine = await page.locator('a[href$="/examine"]').first().getAttribute('href');
  await page.goto(`${examine ?? ''}?at=hydraulic`);
  await page.getByRole('button', { name: 'Record a hydraulic test' }).click();
  const wanted = Number(await page.getByLabel('Pressure wanted').inputValue());
  const readings = page.getByRole('region', { name: 'Readings' });
  const read = async (psi: number) => {
    await readings.getByLabel('Pressure').fill(psi.toFixed(1));
    await readings.getByRole('button', { name: 'Add the reading' }).click();
  };
  const raising = page.getByRole('region', { name: 'Raising the pressure' });
  await expect(raising.getByRole('listitem').first()).toContainText('stop here, look all over, and read');
  await readings.getByRole('button', { name: 'Start the clock' }).click();
  await expect(page.getByRole('button', { name: 'Begin the hold' })).toBeDisabled();
  for (const share of [0.25, 0.5, 0.75]) {
    await page.clock.fastForward('01:00');
    await read(wanted * share);
  }
  await expect(page.getByRole('button', { name: 'Begin the hold' })).toBeDisabled();
  await page.clock.fastForward('01:00');
  await read(wanted + 1);
  await page.getByRole('button', { name: 'Begin the hold' }).click();
  await expect(page.getByRole('timer')).toHaveText('10:00');
  await expectAccessible(page);

  await page.clock.fastForward('04:00');
  await expect(page.getByRole('timer')).toHaveText('6:00');
  await expect(page.getByText('Read the gauge now, add the reading')).toBeVisible();
  await read(wanted + 1);
  await expect(page.getByText('Saved', { exact: true })).toBeVisible();

  // A locked screen or a page loaded again stops timers, not time.
  await page.reload();
  await expect(page.getByRole('timer')).toHaveText('6:00');
  await page.clock.fastForward('06:00');
  await expect(page.getByText('Held long enough')).toBeVisible();
  await expect(page.getByRole('button', { name: 'End the hold' })).toBeDisabled();
  await read(wanted + 1);
  await page.getByRole('button', { name: 'End the hold' }).click();
  await expect(page.getByRole('timer')).toHaveCount(0);
  await page.getByLabel('Filled to the top, all air let out').check();
  await expect(page.getByText(/Held .* for 10 minutes, dry at shell/)).toBeVisible();
});
