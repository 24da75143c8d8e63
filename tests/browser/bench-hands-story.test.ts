import { type Page } from 'playwright-core';
import { axe, story } from './harness';

const bram = { email: 'bram@fallow-yard.example', password: 'cut once measure twice' };
const atStep = (page: Page, step: number) =>
  page.getByRole('heading', { level: 1, name: new RegExp(`^Step ${step} of`) }).waitFor();

async function openBench(page: Page, slug: string): Promise<void> {
  await page.goto(`/plans/${slug}`);
  await page.getByRole('button', { name: /Start a bench copy|Go on at the bench/ }).click();
  await page.getByRole('heading', { level: 1, name: /^Step \d+ of/ }).waitFor();
}

/** To a step by the page keys, as a foot pedal does. */
async function goTo(page: Page, step: number): Promise<void> {
  const heading = page.getByRole('heading', { level: 1, name: /^Step \d+ of/ });
  for (;;) {
    const at = Number(/\d+/.exec(await heading.innerText())?.[0]);
    if (at === step) return;
    await page.keyboard.press(at < step ? 'PageDown' : 'PageUp');
    await atStep(page, at < step ? at + 1 : at - 1);
  }
}

describe('hands busy at the bench, 360 px', () => {
  story(
    'turns steps by space and pedals, reads aloud, holds still under a sleeve',
    async (stage) => {
      const { page, context } = await stage.newPage({ width: 360, as: bram });
      // Headless Chromium has no voice: one is put in its place that notes what it is to say.
      await context.addInitScript(() => {
        const scope = globalThis as unknown as {
          said: string[];
          navigator: { wakeLock: object };
          speechSynthesis: { getVoices: () => unknown; speak: (u: { text: string }) => void };
        };
        scope.said = [];
        // And as a browser does that does not let the screen stay on.
        Object.assign(scope.navigator.wakeLock, {
          request: () => Promise.reject(new DOMException('no', 'NotAllowedError')),
        });
        scope.speechSynthesis.getVoices = () => [{ lang: 'en', name: 'Bench' }];
        scope.speechSynthesis.speak = (utterance) => scope.said.push(utterance.text);
      });
      await openBench(page, 'shooting-board');
      await goTo(page, 1);
      await page.keyboard.press('Space');
      await atStep(page, 2);
      await page.keyboard.press('ArrowRight');
      await atStep(page, 3);
      await page.keyboard.press('ArrowLeft');
      await page.keyboard.press('PageDown');
      await page.keyboard.press('PageDown');
      await atStep(page, 4);

      await page.getByRole('button', { name: 'Read this step aloud' }).click();
      const said = await page.evaluate<string[]>('said');
      expect(said.slice(0, 2)).toEqual([
        'Step four of nine.',
        'Glue bed B to base A with the spacer in the runway.',
      ]);
      expect(said).toContain('Wait forty-five minutes: in clamps.');
      expect(said.join(' ')).not.toMatch(/\d\/\d|[″"×{}]/);
      await page.getByRole('button', { name: 'Stop reading aloud' }).click();

      // A brush of the sleeve: nothing under it is pressed, the pedal still turns the step.
      const next = await page.getByRole('button', { name: 'Done, next step' }).boundingBox();
      await page.getByRole('button', { name: 'Lock against a brush of the sleeve' }).click();
      const bar = page.getByRole('button', { name: 'Locked. Hold here to unlock' });
      await bar.waitFor();
      expect(await axe(page)).toEqual([]);
      const wipe = { x: (next?.x ?? 0) + 20, y: (next?.y ?? 0) + 20 };
      await page.touchscreen.tap(wipe.x, 200);
      await page.touchscreen.tap(wipe.x, wipe.y);
      await page.keyboard.press('PageDown');
      await atStep(page, 5);
      await page.mouse.move(180, wipe.y);
      await page.mouse.down();
      await page
        .getByRole('button', { name: /Locked|Keep holding/ })
        .waitFor({ state: 'detached' });
      await page.mouse.up();
      await atStep(page, 5);
      // The browser was not allowed to keep the screen on, and it is said.
      await page.getByText('This browser does not let the screen stay on').waitFor();

      // Next lies under the hand that is free.
      const x = async (name: string) =>
        (await page.getByRole('button', { name, exact: true }).boundingBox())?.x ?? 0;
      expect(await x('Back')).toBeLessThan(await x('Done, next step'));
      await page.getByRole('radio', { name: 'the left hand' }).click();
      expect(await x('Done, next step')).toBeLessThan(await x('Back'));
      await page.getByRole('radio', { name: 'the right hand' }).click();
    },
  );

  story('lets several waits run, over a reload, and rings when one is over', async (stage) => {
    const { page, context } = await stage.newPage({ width: 360, as: bram });
    await context.grantPermissions(['screen-wake-lock', 'notifications']);
    await context.addInitScript(() => {
      const scope = globalThis as unknown as {
        rung: string[];
        ServiceWorkerRegistration: { prototype: object };
      };
      scope.rung = [];
      Object.assign(scope.ServiceWorkerRegistration.prototype, {
        showNotification: (words: string) => Promise.resolve(void scope.rung.push(words)),
      });
    });
    await page.clock.install();
    await openBench(page, 'shooting-board');
    await goTo(page, 4);
    await page.getByRole('button', { name: 'Start the wait' }).click();
    await page.getByRole('button', { name: 'End it' }).waitFor();
    await goTo(page, 7);
    await page.getByRole('button', { name: 'To step 4' }).waitFor();
    const second = page.getByRole('button', { name: 'Start the wait' });
    const two = (await second.count()) > 0;
    if (two) await second.first().click();
    await page.clock.fastForward('10:00');
    await page
      .getByText(/^3[45]:\d\d$/)
      .first()
      .waitFor();
    await page.getByText('All sent').waitFor();
    await page.reload();
    await page.getByRole('heading', { level: 1, name: /^Step \d+ of/ }).waitFor();
    await goTo(page, 1);
    await page
      .getByText(/^3[45]:\d\d$/)
      .first()
      .waitFor();
    await page.clock.fastForward('36:00');
    await page.getByText('The wait is over: in clamps, step 4').waitFor();
    expect(await page.evaluate('rung')).toContain('The wait is over: in clamps, step 4');
    await page.getByRole('button', { name: 'Over: in clamps, step 4' }).click();
    await page.getByText('The wait is over: in clamps, step 4').waitFor({ state: 'detached' });
    expect(await page.getByText('does not let the screen stay on').count()).toBe(0);
  });

  story('loops the clip over the step’s stretch, at half speed and by frames', async (stage) => {
    const { page } = await stage.newPage({ width: 360, as: bram });
    await openBench(page, 'shooting-board');
    await goTo(page, 4);
    await page.getByLabel(/^Clip of step/).waitFor();
    const time = () => page.evaluate<number>('document.querySelector("video").currentTime');
    const until = async (done: (t: number) => boolean) => {
      while (!done(await time())) await page.waitForTimeout(50);
    };
    await until((t) => t >= 76);
    const start = await time();
    await page.getByRole('button', { name: 'One frame on' }).click();
    await until((t) => t > start);
    expect((await time()) - start).toBeCloseTo(1 / 25, 2);
    await page.getByRole('button', { name: 'One frame back' }).click();
    await until((t) => t === start);
    await page.getByRole('button', { name: 'Half speed' }).click();
    expect(await page.evaluate('document.querySelector("video").playbackRate')).toBe(0.5);
    await page.getByRole('button', { name: 'Half speed' }).click();
    await page.getByRole('button', { name: 'Play the clip' }).click();
    // From just before its end it goes back to the beginning of the stretch, and the step stays.
    await page.evaluate('document.querySelector("video").currentTime = 109.6');
    await until((t) => t > 109);
    await until((t) => t < 80);
    await atStep(page, 4);
    await page.getByText('glue the bed to the base push the spacer tight').waitFor();
    await page.getByRole('button', { name: 'Captions' }).click();
    await page
      .getByText('glue the bed to the base push the spacer tight')
      .waitFor({ state: 'detached' });
    await page.getByRole('button', { name: 'Stop the clip' }).click();
  });
});
