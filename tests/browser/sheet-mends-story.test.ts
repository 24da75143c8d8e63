import { builtDemoPlans } from '../../server/demo';
import { exportPlan } from '../../shared/plan/interchange';
import { axe, story } from './harness';

const odalys = { email: 'odalys@marrow-lane.example', password: 'cut once measure twice' };

story('a creator mends typed figures from the check sheet, in one tap each', async (stage) => {
  const { page } = await stage.newPage({ width: 1280, as: odalys });
  const board = builtDemoPlans()[0]!.built.document;
  const typed = {
    ...board,
    title: `Typed ${Date.now()}`,
    steps: board.steps.map((s, i) =>
      i === 2 ? { ...s, text: 'Cut it to 12 in, then mark 7 1/8 in and 3 in from the end.' } : s,
    ),
  };
  await page.goto('/drafting');
  const chooser = page.waitForEvent('filechooser');
  await page.getByRole('button', { name: 'Bring a plan file' }).click();
  await (
    await chooser
  ).setFiles({
    name: 'plan.json',
    mimeType: 'application/json',
    buffer: Buffer.from(exportPlan(typed)),
  });
  await page.getByRole('heading', { level: 1, name: typed.title }).waitFor();

  const row = (words: string) => page.getByText(words, { exact: true });
  await row('Step 3: 12 in is the value of base_w.').waitFor();
  expect(await axe(page)).toEqual([]);
  await page.getByRole('button', { name: 'Refer to base_w' }).click();
  await row('Step 3: 12 in is the value of base_w.').waitFor({ state: 'detached' });

  await row('Step 3: 7 1/8 in is typed and differs from every dimension.').waitFor();
  await page.getByRole('button', { name: 'Make a dimension of it' }).first().click();
  await row('Step 3: 7 1/8 in is typed and differs from every dimension.').waitFor({
    state: 'detached',
  });
  await page.getByRole('button', { name: 'It is a name' }).click();
  await row('Step 3: 3 in is typed and differs from every dimension.').waitFor({
    state: 'detached',
  });
  await page.getByRole('button', { name: 'Open step 3' }).click();
  await page.getByText('{{base_w}}').first().waitFor();
  expect(await page.getByText('{{size_1}}').count()).toBeGreaterThan(0);
  await page
    .getByText(/^Kept \d/)
    .last()
    .waitFor();
  await page.reload();
  await page
    .getByText(/rules hold/)
    .first()
    .waitFor();
  expect(await page.getByText(/is typed and differs/).count()).toBe(0);
});
