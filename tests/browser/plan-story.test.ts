import { axe, sidewaysScroll, story } from './harness';

describe('a plan on one’s own machine', () => {
  story('a narrower sheet moves parts and steps, and a check is judged with it', async (stage) => {
    const { page } = await stage.newPage({ width: 360 });
    await page.goto('/plans/wall-hung-tool-cabinet');
    await page.getByRole('heading', { level: 1, name: 'Wall-hung tool cabinet' }).waitFor();
    const parts = page.getByRole('table', { name: 'Cut list' });
    const before = await parts.innerText();
    const form = page.getByRole('form', { name: 'On your machine' });
    await form.getByLabel('Sheet thickness').fill('1.1/2');
    await form.getByRole('button', { name: 'Use my figures' }).click();
    // Refused with its reason; what was typed stays.
    expect(await form.getByLabel('Sheet thickness').inputValue()).toBe('1.1/2');
    await form.getByLabel('Sheet thickness').fill('16.2');
    await form.getByLabel('Back panel thickness').fill('6.4');
    await form.getByLabel('Saw kerf').fill('2.6');
    await form.getByRole('button', { name: 'Use my figures' }).click();
    await page.getByText(/figures differ/).waitFor();
    const after = await parts.innerText();
    expect(after).not.toBe(before);
    expect(after).toContain('maker’s');
    expect(await axe(page)).toEqual([]);
    expect(await sidewaysScroll(page)).toBe(0);
    // Kept in this browser.
    await page.reload();
    await page.getByText(/figures differ/).waitFor();
    await page.getByRole('button', { name: 'Back to the maker’s' }).click();
    await page.getByText(/figures differ/).waitFor({ state: 'detached' });
  });
});
