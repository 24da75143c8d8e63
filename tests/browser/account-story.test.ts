import { story } from './harness';

describe('an account', () => {
  story('is made, confirmed by letter, signed in and out', async (stage) => {
    const email = `nell-${Date.now()}@chalk-end.example`;
    const opened = await stage.newPage({ width: 360 });
    const { page } = opened;
    // A wrong password answers 401, which the browser notes in its console.
    opened.forgive(/401/);
    await page.goto('/sign-up');
    await page.getByLabel('Name others see').fill('Nell Rabbet');
    await page.getByLabel('E-mail').fill(email);
    await page.getByLabel('Password', { exact: true }).fill('short');
    await page.getByRole('button', { name: 'Make the account' }).click();
    await page.getByText('Please read and accept the terms and the safety notice.').waitFor();
    await page.getByLabel('Password', { exact: true }).fill('a long enough phrase');
    await page.getByRole('checkbox').click();
    await page.getByRole('button', { name: 'Make the account' }).click();
    await page.getByRole('heading', { name: 'Look for our letter' }).first().waitFor();

    const letter = await stage.letter(email, /Confirm/);
    const link = /https?:\/\/\S+confirm\?token=\S+/.exec(letter.text)?.[0] ?? '';
    await page.goto(new URL(link).pathname + new URL(link).search);
    await page.getByRole('button', { name: 'Confirm my e-mail' }).click();
    await page.getByText('Your e-mail is confirmed.').waitFor();

    await page.goto('/sign-in');
    await page.getByLabel('E-mail').fill(email);
    await page.getByLabel('Password', { exact: true }).fill('not this one at all');
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.getByText(/don’t go together/).waitFor();
    expect(await page.getByLabel('E-mail').inputValue()).toBe(email);
    await page.getByLabel('Password', { exact: true }).fill('a long enough phrase');
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.getByRole('button', { name: 'Sign out' }).click();
    await page.waitForURL((url) => url.pathname === '/');
  });
});
