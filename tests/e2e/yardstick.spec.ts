import { expect, test } from './support/test'

test('a link brings a page of Yardstick back, which then answers to typing', async ({
  page,
  checkAccessible,
}) => {
  await page.goto('/tools/yardstick?z=0.5+2&c=planck-2018&c=H0:70,Om0:0.3,Ode0:1.75')
  await expect(page.getByRole('button', { name: '15,924.6' })).toBeVisible()
  await expect(page.getByText('does not exist: past the turn at z = 0.92').first()).toBeVisible()

  await page.getByLabel('Redshifts', { exact: true }).fill('1')
  await expect(page.getByRole('button', { name: '6,791.3' })).toBeVisible()
  await expect(page).toHaveURL(/\?z=1&c=planck-2018&c=H0:70,Om0:0.3,Ode0:1.75$/)
  await page.reload()
  await expect(page.getByRole('button', { name: '6,791.3' })).toBeVisible()

  await page.getByRole('button', { name: 'Parameters of Own: Ωm 0.30, ΩΛ 1.75' }).click()
  await page.getByLabel('H₀').fill('0')
  await expect(page.getByText('The Hubble constant H₀ must be above 0 km/s/Mpc.').first()).toBeVisible()
  await checkAccessible()
})

test('Yardstick finds the redshift of an age and copies what it shows', async ({ page, context }) => {
  await context.grantPermissions(['clipboard-read', 'clipboard-write'])
  await page.goto('/tools/yardstick?c=planck-2018')
  await page.getByRole('radio', { name: 'Find the redshift' }).check()
  await page.getByRole('textbox', { name: 'Values' }).fill('3300 Myr\n20 Gyr')
  await expect(page.getByRole('cell', { name: 'Planck 2018 is younger' })).toBeVisible()
  await page.getByRole('button', { name: 'Copy as CSV' }).click()
  await expect(page.getByText('Copied two rows as CSV.', { exact: true })).toBeVisible()
  const copied = await page.evaluate(() => navigator.clipboard.readText())
  // Astropy, z_at_value(Planck18.age, 3.3 Gyr): 1.9856.
  expect(copied).toMatch(/^ageGyr \(Gyr\),z_1\r\n3\.3,1\.985\d+\r\n20,\r\n$/)
})

test('typing beside a thousand rows is read as it comes', async ({ page }) => {
  await page.goto('/tools/yardstick?z=0.005..4.995+step+0.005')
  await expect(page.getByText('999 redshifts read.')).toBeVisible()
  await page.getByLabel('Redshifts', { exact: true }).focus()
  await page.keyboard.press('Control+End')
  await page.keyboard.type('\n5.25')
  await expect(page.getByText('1,000 redshifts read.')).toBeVisible()
  await page.keyboard.type('\n6')
  await expect(page.getByText(/1,000/).first()).toBeVisible()
})
