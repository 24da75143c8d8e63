import { axe, story } from './harness';

const odalys = { email: 'odalys@marrow-lane.example', password: 'cut once measure twice' };

async function begin(
  base: string,
  request: { post: (url: string, options: object) => Promise<{ json(): Promise<unknown> }> },
  title: string,
) {
  const answer = await request.post(`${base}/api/drafts`, {
    headers: { 'X-Scantling': '1' },
    data: { id: crypto.randomUUID(), title, units: 'mm' },
  });
  return ((await answer.json()) as { id: string }).id;
}

describe('a draft in two windows', () => {
  story('never loses work silently: the person chooses', async (stage) => {
    const one = await stage.newPage({ width: 1280, as: odalys });
    const two = await stage.newPage({ width: 1280, as: odalys });
    two.forgive(/409/);
    const id = await begin(stage.base, one.context.request, 'Two windows');
    for (const { page } of [one, two]) {
      await page.goto(`/drafting/${id}`);
      await page.getByRole('tab', { name: 'About' }).click();
    }
    await one.page.getByLabel('What it is, in a few sentences').fill('From the first window.');
    await one.page
      .getByText(/^Kept \d/)
      .last()
      .waitFor();
    await two.page.getByLabel('What it is, in a few sentences').fill('From the second window.');
    const dialog = two.page.getByRole('dialog');
    await dialog.waitFor();
    expect(await axe(two.page)).toEqual([]);
    await dialog.getByRole('button', { name: 'Keep mine' }).click();
    await two.page
      .getByText(/^Kept \d/)
      .last()
      .waitFor();
    await one.page.reload();
    await one.page.getByRole('tab', { name: 'About' }).click();
    expect(await one.page.getByLabel('What it is, in a few sentences').inputValue()).toBe(
      'From the second window.',
    );
  });

  story(
    'keeps what is typed with no signal, through a reload, and saves it later',
    async (stage) => {
      const { page, context, ...rest } = await stage.newPage({ width: 360, as: odalys });
      rest.forgive(/ERR_INTERNET_DISCONNECTED|Failed to fetch/);
      const id = await begin(stage.base, context.request, 'No signal');
      await page.goto(`/drafting/${id}`);
      await page.getByRole('tab', { name: 'About' }).click();
      await context.setOffline(true);
      await page.getByLabel('What it is, in a few sentences').fill('Typed in the cellar.');
      await page.getByText('No signal. Kept in this browser').first().waitFor();
      await context.setOffline(false);
      await page.reload();
      await page
        .getByText(/^Kept \d/)
        .first()
        .waitFor();
      await page.getByRole('tab', { name: 'About' }).click();
      expect(await page.getByLabel('What it is, in a few sentences').inputValue()).toBe(
        'Typed in the cellar.',
      );
    },
  );
});
