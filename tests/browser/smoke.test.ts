import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { webPages } from '../../server/http/web-routes';
import { axe, sidewaysScroll, story } from './harness';

const dist = join(__dirname, '../../dist');
const files = readdirSync(dist, { recursive: true, encoding: 'utf8' }).filter((name) =>
  name.endsWith('.html'),
);
// Every address of the export that holds no parameter.
const routes = [
  ...new Set(
    webPages(files)
      .filter(({ segments }) => !segments.some((segment) => segment.startsWith('[')))
      .map(({ segments }) => `/${segments.join('/')}`),
  ),
].sort();

const looks = [
  { width: 360, theme: 'day' },
  { width: 1280, theme: 'night' },
] as const;

it('finds the static routes of the export', () => {
  expect(routes).toContain('/');
  expect(routes.length).toBeGreaterThan(4);
});

describe.each(looks)('signed out, $width px, by $theme', (look) => {
  for (const route of routes) {
    story(
      `${route} shows, holds no accessibility finding and does not scroll sideways`,
      async (stage) => {
        const { page } = await stage.newPage(look);
        await page.goto(route);
        await page.getByRole('heading', { level: 1 }).first().waitFor();
        await page.waitForLoadState('networkidle');
        expect(await axe(page)).toEqual([]);
        expect(await sidewaysScroll(page)).toBe(0);
      },
    );
  }
});

describe.each(looks)('a published plan, $width px, by $theme', (look) => {
  story('reads signed out, with its own title in the document as served', async (stage) => {
    const list = (await (await fetch(`${stage.base}/api/plans`)).json()) as {
      items: { slug: string; title: string }[];
    };
    const plan = list.items[0];
    if (plan === undefined) throw new Error('The demo data holds no published plan.');
    const served = await (await fetch(`${stage.base}/plans/${plan.slug}`)).text();
    expect(served).toContain(`property="og:title" content="${plan.title}`);
    const { page } = await stage.newPage(look);
    await page.goto(`/plans/${plan.slug}`);
    await page.getByRole('heading', { level: 1, name: plan.title }).waitFor();
    await page.waitForLoadState('networkidle');
    expect(await axe(page)).toEqual([]);
    expect(await sidewaysScroll(page)).toBe(0);
  });
});

story('an unknown address says so', async (stage) => {
  const watched = await stage.newPage();
  const { page } = watched;
  // The document itself answers 404, which the console reports.
  watched.forgive(/404/);
  const answer = await page.goto('/no/such/place');
  expect(answer?.status()).toBe(404);
  await page.getByRole('heading', { level: 1 }).waitFor();
});
