import { axe, sidewaysScroll, story, type Stage } from './harness';
import { type PlanDocument } from '../../shared/plan/document';

const odalys = { email: 'odalys@marrow-lane.example', password: 'cut once measure twice' };

/** A copy of a demo plan of one's own, so that no other story sees what is changed; leads to its steps. */
async function ownCopy(stage: Stage, width: 360 | 1280) {
  const opened = await stage.newPage({ width, as: odalys });
  const { page, context } = opened;
  const drafts = (await (await context.request.get(`${stage.base}/api/drafts`)).json()) as {
    items: { id: string; slug: string | null }[];
  };
  const id = drafts.items.find((d) => d.slug === 'shooting-board')?.id ?? '';
  const draft = (await (await context.request.get(`${stage.base}/api/drafts/${id}`)).json()) as {
    document: PlanDocument;
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
  const own = () => /drafting\/([0-9a-f-]+)/.exec(page.url())?.[1] ?? '';
  /** The draft as the server has it, once it holds this. */
  const kept = async (words: string): Promise<PlanDocument> => {
    for (;;) {
      const saved = page
        .waitForResponse((r) => r.request().method() === 'PUT', { timeout: 5000 })
        .catch(() => null);
      const text = await (await context.request.get(`${stage.base}/api/drafts/${own()}`)).text();
      if (text.includes(words)) return (JSON.parse(text) as { document: PlanDocument }).document;
      if (!(await saved)) throw new Error(`The draft was not saved with ${words}.`);
    }
  };
  return { ...opened, kept };
}

describe('a creator works on a step', () => {
  story('cautions keep their own weight and moment when one before them goes', async (stage) => {
    const { page, kept } = await ownCopy(stage, 1280);
    await page.getByRole('button', { name: 'Open step 1', exact: true }).click();
    const add = page.getByRole('button', { name: 'Add to cautions' });
    const words = page.getByLabel('What can hurt, and what to do');
    await add.click();
    await words.fill('Fingers out of the line of the blade.');
    await add.click();
    await words.fill('Unplug the saw before you reach under it.');
    await page.getByLabel('Weight').selectOption('danger');
    await page.getByLabel('Said in the clip at').fill('0:12');
    await page.getByLabel('Said in the clip at').press('Enter');
    await page.getByRole('button', { name: /^Open Fingers out/ }).click();
    await page.getByRole('button', { name: /^Take out Fingers/ }).click();
    const cautions = (plan: PlanDocument) =>
      plan.steps[0]?.cautions.map(({ text, level, at }) => ({ text, level, at }));
    const unplug = {
      text: 'Unplug the saw before you reach under it.',
      level: 'danger',
      at: 12,
    };
    expect(cautions(await kept('"level":"danger"'))).toEqual(expect.arrayContaining([unplug]));
    // What was written since the undo was offered stays.
    await page.getByLabel('Title, as an order').fill('Cut the base to size');
    await kept('Cut the base to size');
    await page.getByRole('button', { name: 'Put it back' }).click();
    const plan = await kept('Fingers out of the line');
    expect(plan.steps[0]?.title).toBe('Cut the base to size');
    expect(cautions(plan)?.slice(-2)).toEqual([
      { text: 'Fingers out of the line of the blade.', level: 'care', at: undefined },
      unplug,
    ]);
  });

  story('says what is done, and the check sheet follows', async (stage) => {
    const { page } = await ownCopy(stage, 1280);
    await page.getByRole('button', { name: 'Open step 1', exact: true }).click();
    await page.getByRole('button', { name: /^What is done/ }).click();
    await page.getByRole('button', { name: 'A guard' }).click();
    await page.getByLabel('Machine', { exact: true }).selectOption('table-saw');
    await page.getByRole('button', { name: 'A cut' }).click();
    await page.getByLabel('Machine', { exact: true }).selectOption('table-saw');
    await page.getByLabel('Cut', { exact: true }).selectOption('through-rip');
    const unguarded = page.getByText('Step 1 cuts through with the blade guard off.').first();
    await unguarded.waitFor();
    expect(await axe(page)).toEqual([]);
    await page
      .getByLabel('What guards the cut where the machine’s guard cannot pass')
      .fill('A tunnel guard over the fence and a riving knife behind the blade.');
    await unguarded.waitFor({ state: 'detached' });
  });

  story('types an in and an out to their ends, and sees when they cross', async (stage) => {
    const { page, kept } = await ownCopy(stage, 360);
    await page.getByRole('tab', { name: 'Steps' }).waitFor();
    await page.getByRole('button', { name: 'Open step 1', exact: true }).click();
    const [from, to] = [
      page.getByLabel('In', { exact: true }),
      page.getByLabel('Out', { exact: true }),
    ];
    await to.fill('');
    await to.pressSequentially('1:28');
    await from.fill('');
    await from.pressSequentially('1:04');
    expect([await from.inputValue(), await to.inputValue()]).toEqual(['1:04', '1:28']);
    await to.fill('0:30');
    await page.getByText(/The out lies before the in/).waitFor();
    const plan = await kept('{"start":64,"end":88}');
    expect(plan.steps[0]?.stretches[0]).toEqual({ start: 64, end: 88 });
    expect(await sidewaysScroll(page)).toBe(0);
    expect(await axe(page)).toEqual([]);
  });

  story(
    'switches a rule off with a reason, and on again; the open tab outlives a reload',
    async (stage) => {
      const { page, kept } = await ownCopy(stage, 1280);
      await page.getByRole('button', { name: 'Open step 1', exact: true }).click();
      const line = /No gloves, loose sleeves/;
      await page.getByRole('button', { name: /^What is done/ }).click();
      await page.getByRole('button', { name: 'A cut' }).click();
      await page.getByRole('button', { name: line }).click();
      await kept('safety/loose-clothing');
      await page.getByRole('tab', { name: 'Tools and links' }).click();
      await page.reload();
      await page.getByRole('tab', { name: 'Tools and links', selected: true }).waitFor();
      const off = page
        .getByRole('button', { name: /^Switch safety.loose-clothing off here$/ })
        .first();
      const rule =
        /^Switch (.*) off here$/.exec((await off.getAttribute('aria-label')) ?? '')?.[1] ?? '';
      await off.click();
      await page.getByLabel('Why it does not count here').fill('The clip shows it whole.');
      await page.getByRole('button', { name: 'Switch it off' }).click();
      await page.getByRole('button', { name: /^Switched off, 1/ }).click();
      await page.getByText('The clip shows it whole.').waitFor();
      await page.getByRole('button', { name: `Switch ${rule} on` }).click();
      await page
        .getByRole('button', { name: `Switch ${rule} off here` })
        .first()
        .waitFor();
    },
  );
});
