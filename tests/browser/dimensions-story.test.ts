import { axe, sidewaysScroll, story, type Stage } from './harness';

const odalys = { email: 'odalys@marrow-lane.example', password: 'cut once measure twice' };

/** A copy of a demo plan of one's own, so that no other story sees what is changed; leads to its dimensions. */
async function ownCopy(stage: Stage, width: 360 | 1280) {
  const opened = await stage.newPage({ width, as: odalys });
  const { page, context } = opened;
  const drafts = (await (await context.request.get(`${stage.base}/api/drafts`)).json()) as {
    items: { id: string; slug: string | null }[];
  };
  const id = drafts.items.find((d) => d.slug === 'shooting-board')?.id ?? '';
  const draft = (await (await context.request.get(`${stage.base}/api/drafts/${id}`)).json()) as {
    document: unknown;
  };
  await page.goto('/drafting');
  const chooser = page.waitForEvent('filechooser');
  await page.getByRole('button', { name: 'Bring a plan file' }).click();
  await (
    await chooser
  ).setFiles({
    name: 'plan.json',
    mimeType: 'application/json',
    buffer: Buffer.from(JSON.stringify(draft.document)),
  });
  await page.getByRole('heading', { level: 1, name: 'Shooting board' }).waitFor();
  await page.getByRole('tab', { name: 'Dimensions' }).click();
  return opened;
}

describe('a creator works on dimensions', () => {
  story('breaks a check and mends it from the check sheet', async (stage) => {
    const { page } = await ownCopy(stage, 1280);
    await page.getByRole('button', { name: /^Work on base_w/ }).click();
    const figure = page.getByRole('combobox', { name: 'Figure of base_w' });
    await figure.fill('13 1/2 in');
    const row = page.getByRole('button', { name: /Check “.*” fails.*Go there/ }).first();
    await row.click();
    await page.getByRole('tab', { name: 'Checks', selected: true }).waitFor();
    expect(await axe(page)).toEqual([]);
    const mend = page.getByRole('button', { name: /^Make base_w/ }).first();
    await mend.click();
    await row.waitFor({ state: 'detached' });
    await page
      .getByText(/^Kept \d/)
      .last()
      .waitFor();
  });

  story('completes names, sees what is wrong where it is wrong, by keys alone', async (stage) => {
    const { page } = await ownCopy(stage, 1280);
    await page.getByRole('button', { name: /^Work on bed_w/ }).focus();
    await page.keyboard.press('Enter');
    const expression = page.getByRole('combobox', { name: 'Expression of bed_w' });
    await expression.fill('base_w - run');
    await page.getByRole('option', { name: 'runway Runway' }).waitFor();
    await page.keyboard.press('Enter');
    expect(await expression.inputValue()).toBe('base_w - runway');
    await expression.fill('base_w - runwey');
    await page.getByText(/Column 10: .*The last good figure was/).waitFor();
    await page.getByRole('button', { name: 'Use runway' }).click();
    expect(await expression.inputValue()).toBe('base_w - runway');
    await expression.focus();
    await page.keyboard.press('ArrowDown');
    await page.getByRole('combobox', { name: /of fence_l/ }).waitFor();
    await page.getByRole('heading', { level: 2, name: 'fence_l' }).waitFor();
    await page.getByRole('button', { name: 'Go to bed_w' }).first().click();
    await page.getByRole('heading', { level: 2, name: 'bed_w' }).waitFor();
  });

  story('on a phone the fields stand under the row', async (stage) => {
    const { page } = await ownCopy(stage, 360);
    await page.getByRole('button', { name: /^Work on runway/ }).click();
    await page.getByRole('heading', { level: 3, name: 'What feeds it' }).waitFor();
    expect(await axe(page)).toEqual([]);
    expect(await sidewaysScroll(page)).toBe(0);
  });
});
