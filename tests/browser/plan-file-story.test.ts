import { readFileSync } from 'node:fs';
import { axe, story } from './harness';

const odalys = { email: 'odalys@marrow-lane.example', password: 'cut once measure twice' };

story('a plan leaves as a file and comes back; a broken one names its faults', async (stage) => {
  const { page, context } = await stage.newPage({ width: 1280, as: odalys });
  const drafts = (await (await context.request.get(`${stage.base}/api/drafts`)).json()) as {
    items: { id: string; slug: string | null }[];
  };
  const id = drafts.items.find((d) => d.slug === 'rolling-outfeed-cart')?.id ?? '';
  await page.goto(`/drafting/${id}`);
  await page.getByRole('tab', { name: 'Publish' }).click();
  const saving = page.waitForEvent('download');
  await page.getByRole('button', { name: 'Save the plan as a file' }).click();
  const text = readFileSync(await (await saving).path(), 'utf8');

  const bring = async (content: string) => {
    await page.goto('/drafting');
    const chooser = page.waitForEvent('filechooser');
    await page.getByRole('button', { name: 'Bring a plan file' }).click();
    await (
      await chooser
    ).setFiles({ name: 'plan.json', mimeType: 'application/json', buffer: Buffer.from(content) });
  };
  const broken = JSON.parse(text) as { units: string; steps: { handsOn: unknown }[] };
  broken.units = 'ells';
  broken.steps[1]!.handsOn = 'long';
  await bring(JSON.stringify(broken));
  await page.getByText('steps[1].handsOn').waitFor();
  await page.getByText('2 faults').waitFor();
  expect(await axe(page)).toEqual([]);

  await bring(text);
  await page.getByRole('heading', { level: 1, name: 'Rolling outfeed cart' }).waitFor();
  expect(new URL(page.url()).pathname).not.toContain(id);
});
