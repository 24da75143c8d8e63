import { axe, sidewaysScroll, story } from './harness';

const password = 'cut once measure twice';
const looks = [
  { width: 360, theme: 'night' },
  { width: 1280, theme: 'day' },
] as const;
const walks = [
  {
    email: 'odalys@marrow-lane.example',
    routes: ['/drafting', '/you', '/you/sessions', '/shop-card', '/bench'],
  },
  { email: 'gus@scantling.example', routes: ['/cases'] },
  { email: 'ada@scantling.example', routes: ['/you/people'] },
] as const;

describe.each(looks)('signed in, $width px, by $theme', (look) => {
  for (const { email, routes } of walks) {
    story(`${routes.join(', ')} show, without an accessibility finding`, async (stage) => {
      const { page } = await stage.newPage({ ...look, as: { email, password } });
      for (const route of routes) {
        await page.goto(route);
        await page.getByRole('heading', { level: 1 }).first().waitFor();
        await page.waitForLoadState('networkidle');
        expect([route, await axe(page)]).toEqual([route, []]);
        expect(await sidewaysScroll(page)).toBe(0);
      }
    });
  }

  story('every part of a draft shows, without an accessibility finding', async (stage) => {
    const { page, context } = await stage.newPage({
      ...look,
      as: { email: walks[0].email, password },
    });
    const drafts = (await (await context.request.get(`${stage.base}/api/drafts`)).json()) as {
      items: { id: string; slug: string | null }[];
    };
    const draft = drafts.items.find((d) => d.slug === 'shooting-board');
    await page.goto(`/drafting/${draft?.id ?? ''}`);
    for (const tab of [
      'Clip and steps',
      'Dimensions',
      'Checks',
      'Parts and stock',
      'Tools and links',
      'About',
      'Publish',
    ]) {
      await page.getByRole('tab', { name: tab }).click();
      if (tab === 'Clip and steps') await page.getByRole('button', { name: 'Open step 4' }).click();
      if (tab === 'Dimensions') await page.getByRole('button', { name: /^Work on runway/ }).click();
      expect([tab, await axe(page)]).toEqual([tab, []]);
      expect([tab, await sidewaysScroll(page)]).toEqual([tab, 0]);
    }
  });
});
