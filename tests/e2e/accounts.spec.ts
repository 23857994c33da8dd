import { letter, linkIn } from './support/inbox'
import { expect, test } from './support/test'

test.describe('accounts', () => {
  test('register, confirm by letter, sign in, forget the password, sign out for good', async ({
    page,
    request,
    context,
    signIn,
    checkAccessible,
  }) => {
    const email = `nadja.${Date.now()}@arvel.example`
    await page.goto('/register')
    await checkAccessible()
    await page.getByRole('button', { name: 'Open the account' }).click()
    await expect(page.getByText('Give your e-mail address.').first()).toBeVisible()
    await page.getByLabel('Name').fill('Nadja Hollin')
    await page.getByLabel('E-mail').fill(email)
    await page.getByLabel('Institute').fill('Arvel Institute')
    await page.getByLabel('Password', { exact: true }).fill('too short')
    await page.getByRole('button', { name: 'Open the account' }).click()
    await expect(page.getByText('Take at least 12 characters').first()).toBeVisible()
    await expect(page.getByLabel('Name')).toHaveValue('Nadja Hollin')
    await page.getByLabel('Password', { exact: true }).fill('three words in a row')
    await page.getByRole('button', { name: 'Open the account' }).click()
    await expect(page.getByText('A letter is on its way').first()).toBeVisible()

    const confirm = linkIn((await letter(request, email, /Confirm your address/)).text)
    await page.goto(confirm)
    await page.getByRole('button', { name: 'Confirm this address' }).click()
    await expect(page.getByText('Your address is confirmed.')).toBeVisible()
    await page.goto(confirm)
    await page.getByRole('button', { name: 'Confirm this address' }).click()
    await expect(page.getByText('has been used or is too old').first()).toBeVisible()

    await signIn(email, 'three words in a row')
    await expect(page.getByRole('link', { name: 'Nadja Hollin' })).toBeVisible()

    const copied = await context.cookies()
    await page.getByRole('button', { name: 'Sign out' }).click()
    await expect(page.getByRole('link', { name: 'Sign in' })).toBeVisible()
    await context.clearCookies()
    await context.addCookies(copied)
    await page.goto('/account')
    await expect(page).toHaveURL(/\/sign-in/)

    await page.goto('/forgot-password')
    await page.getByLabel('E-mail').fill(email)
    await page.getByRole('button', { name: 'Send the link' }).click()
    await expect(page.getByText('A letter is on its way').first()).toBeVisible()
    await page.goto(linkIn((await letter(request, email, /Choose a new password/)).text))
    await page.getByLabel('New password').fill('another three words')
    await page.getByRole('button', { name: 'Keep this password' }).click()
    await expect(page.getByText('Your new password holds from now on.')).toBeVisible()
    await signIn(email, 'another three words')
    await expect(page.getByRole('link', { name: 'Nadja Hollin' })).toBeVisible()
  })

  test.describe('with a wrong password', () => {
    test.use({ expectedNoise: [/status of 401/] })

    test('say so at the field and keep the address', async ({ page }) => {
      await page.goto('/sign-in')
      await page.getByLabel('E-mail').fill('ilse@tarnhead.example')
      await page.getByLabel('Password', { exact: true }).fill('not the password')
      await page.getByRole('button', { name: 'Sign in' }).click()
      await expect(page.getByText('This address and password do not go together.').first()).toBeVisible()
      await expect(page.getByLabel('E-mail')).toHaveValue('ilse@tarnhead.example')
    })
  })

  test('a page that needs to know who asks sends to sign in and comes back', async ({ page }) => {
    await page.goto('/account')
    await expect(page).toHaveURL(/\/sign-in\?next=%2Faccount/)
    await page.getByLabel('E-mail').fill('ilse@tarnhead.example')
    await page.getByLabel('Password', { exact: true }).fill('night-after-night')
    await page.getByRole('button', { name: 'Sign in' }).click()
    await expect(page).toHaveURL(/\/account$/)
  })
})
