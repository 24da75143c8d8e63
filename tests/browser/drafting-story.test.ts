import { join } from 'node:path';
import sharp from 'sharp';
import { axe, story } from './harness';

const odalys = { email: 'odalys@marrow-lane.example', password: 'cut once measure twice' };
const clip = join(__dirname, '../../assets/demo/trammel.mp4');
const captions = Buffer.from(
  [
    'WEBVTT',
    '',
    '00:00:01.000 --> 00:00:06.000',
    'hello and welcome back to the shop',
    '',
    '00:00:20.000 --> 00:00:26.000',
    'first cut the shelf to six hundred millimeters by two hundred',
    '',
    '00:00:50.000 --> 00:00:56.000',
    'next drill two holes eight millimeters from the edge',
    '',
    '00:01:20.000 --> 00:01:26.000',
    'now glue the rail on and wait thirty minutes keep your fingers clear of the clamp',
    '',
  ].join('\n'),
);

describe('a creator makes a plan of a clip and its captions', () => {
  story(
    'brings both, gets steps, adds a part and a dimension, publishes over the check sheet',
    async (stage) => {
      const { page } = await stage.newPage({ width: 1280, as: odalys });
      await page.goto('/drafting');
      const title = `Peg shelf ${Date.now()}`;
      await page.getByLabel('Title of a new plan').fill(title);
      await page.getByRole('button', { name: 'Begin the plan' }).click();
      await page.getByRole('heading', { level: 1, name: title }).waitFor();

      const pick = async (
        name: string,
        file: string | { name: string; mimeType: string; buffer: Buffer },
      ) => {
        const chooser = page.waitForEvent('filechooser');
        await page.getByRole('button', { name }).click();
        await (await chooser).setFiles(file);
      };
      await pick('Clip file', clip);
      await page.getByLabel('Clip of the draft').waitFor();
      await pick('Caption file', { name: 'shelf.vtt', mimeType: 'text/vtt', buffer: captions });
      await page.getByText(/jotted down/).waitFor();
      await page.getByRole('button', { name: 'Open step 1' }).waitFor();
      expect(await axe(page)).toEqual([]);

      // The order changes by Alt with an arrow, and back.
      const first = page.getByRole('list', { name: 'Steps' }).getByRole('listitem').first();
      const was = await first.innerText();
      await first.getByRole('button', { name: /Open step 1/ }).press('Alt+ArrowDown');
      expect(await first.innerText()).not.toBe(was);
      await page.getByRole('button', { name: 'Open step 2' }).press('Alt+ArrowUp');
      expect(await first.innerText()).toBe(was);

      // A photo on a step, with its words; the check sheet asked for them beside the steps.
      await page.getByRole('button', { name: 'Open step 1' }).click();
      const picture = await sharp({
        create: { width: 320, height: 200, channels: 3, background: '#778286' },
      })
        .jpeg()
        .toBuffer();
      await pick('Add photos', { name: 'shelf.jpg', mimeType: 'image/jpeg', buffer: picture });
      await page.getByText('Photo 1 has no words for those who cannot see it.').waitFor();
      await page
        .getByLabel('What photo 1 shows, for those who cannot see it')
        .fill('A grey shelf.');
      await page
        .getByText('Photo 1 has no words for those who cannot see it.')
        .waitFor({ state: 'detached' });

      await page.getByRole('tab', { name: 'Dimensions' }).click();
      await page.getByRole('button', { name: 'Add a dimension' }).click();
      const figure = page.getByRole('combobox', { name: 'Figure of d1' });
      await figure.fill('1.1/2');
      await page
        .getByText(/Column/)
        .first()
        .waitFor();
      await figure.fill('600 mm');
      await page
        .getByText(/Column/)
        .first()
        .waitFor({ state: 'detached' });
      await page
        .getByText(/^Kept \d/)
        .last()
        .waitFor();

      await page.getByRole('tab', { name: 'Publish' }).click();
      await page.getByText('The plan has no parts.').waitFor();
      const reasons = page.getByLabel(/Publish all the same/);
      for (let i = 0; i < (await reasons.count()); i += 1) {
        await reasons.nth(i).fill('A plan of one board: the clip shows it whole.');
      }
      await page.getByRole('button', { name: /^Publish/ }).click();
      await page.waitForURL(/\/plans\/peg-shelf/);
      await page.getByRole('heading', { level: 1, name: title }).waitFor();
      await page
        .getByText(/published it all the same/)
        .first()
        .waitFor();
    },
    90_000,
  );
});
