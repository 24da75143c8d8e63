import { axe, sidewaysScroll, story } from './harness';

const tilda = { email: 'tilda@plumbhollow.example', password: 'cut once measure twice' };

describe('a builder follows a plan at the bench, 360 px', () => {
  story('reads their own sheet, is told where the clip differs, and is judged', async (stage) => {
    const { page } = await stage.newPage({ width: 360, as: tilda });
    await page.goto('/plans/shooting-board');
    await page.getByRole('button', { name: /Start a bench copy|Go on at the bench/ }).click();
    await page.getByRole('heading', { level: 1, name: 'Step 1 of 9' }).waitFor();
    await page.getByText('The clip says').first().waitFor();
    expect(await axe(page)).toEqual([]);
    expect(await sidewaysScroll(page)).toBe(0);

    await page.getByRole('button', { name: 'Reading' }).click();
    await page.getByLabel('What you read').fill('1.1/2');
    await page.getByRole('button', { name: 'Take reading', exact: true }).click();
    // A figure that is none is refused with its reason, and what was typed stays.
    expect(await page.getByLabel('What you read').inputValue()).toBe('1.1/2');
    await page.getByLabel('What you read').fill('11/16');
    await page.getByRole('button', { name: 'Take reading', exact: true }).click();
    await page.getByText('Taken. The plan follows it.').waitFor();
    await page.getByRole('button', { name: 'Done reading' }).click();

    // Ticked, and the next step shows.
    await page.getByRole('button', { name: 'Done, next step' }).click();
    await page.getByRole('heading', { level: 1, name: 'Step 2 of 9' }).waitFor();
    await page.getByRole('button', { name: 'Reading' }).click();
    await page.getByLabel('What you read').fill('12 1/4');
    await page.getByRole('button', { name: 'Take reading', exact: true }).click();
    await page.getByText(/one more pass/).waitFor();
    await page.getByRole('button', { name: 'Done reading' }).click();

    // A check of a later step is answered by a trial.
    for (const step of [3, 4]) {
      await page.getByRole('button', { name: 'Done, next step' }).click();
      await page.getByRole('heading', { level: 1, name: `Step ${step} of 9` }).waitFor();
    }
    await page.getByRole('button', { name: 'Plane runs free: Fits' }).click();
    await page.getByText('The trial fits.').waitFor();
    expect(await axe(page)).toEqual([]);

    // The note is kept, and everything is there after a reload.
    await page.getByLabel('A note for yourself').fill('Sheet is bowed.');
    await page.getByRole('button', { name: 'Keep the note' }).click();
    await page.getByText('Sheet is bowed.').waitFor();
    await page.getByText('All sent').waitFor();
    await page.reload();
    await page.getByRole('heading', { level: 1, name: 'Step 4 of 9' }).waitFor();
    await page.getByText('Sheet is bowed.').waitFor();
  });
});
