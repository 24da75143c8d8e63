import { axe, story } from './harness';

const word = 'cut once measure twice';
const as = (email: string) => ({ width: 1280 as const, as: { email, password: word } });

describe('talk and order', () => {
  story('a builder critiques, the maker answers and settles it', async (stage) => {
    const builder = await stage.newPage(as('tilda@plumbhollow.example'));
    await builder.page.goto('/plans/rolling-outfeed-cart');
    await builder.page.getByRole('button', { name: 'Critique or ask' }).click();
    await builder.page.getByLabel('What should change').fill('Lock the castors before step 9.');
    await builder.page.getByRole('button', { name: 'Send the critique' }).click();
    // Why is needed: the field is marked, the words stay.
    await builder.page.getByText('Say why: it is what the maker can use.').waitFor();
    await builder.page.getByLabel('Why').fill('Mine rolled when I leaned on it.');
    await builder.page.getByRole('button', { name: 'Send the critique' }).click();
    await builder.page.getByText('Lock the castors before step 9.').waitFor();

    const maker = await stage.newPage(as('odalys@marrow-lane.example'));
    await maker.page.goto('/plans/rolling-outfeed-cart');
    await maker.page.getByText('Lock the castors before step 9.').waitFor();
    await maker.page.getByRole('button', { name: 'Answer', exact: true }).first().click();
    await maker.page.getByLabel('Your answer').fill('Right, the caution says so from now on.');
    await maker.page
      .getByRole('form', { name: 'Answer' })
      .getByRole('button', { name: 'Answer' })
      .click();
    await maker.page.getByText('Right, the caution says so from now on.').waitFor();
    await maker.page
      .getByRole('button', { name: 'More about Odalys Adze’s words' })
      .first()
      .click();
    await maker.page.getByRole('menuitem', { name: 'This settles it' }).click();
    await maker.page.getByText('settled', { exact: true }).first().waitFor();
    expect(await axe(maker.page)).toEqual([]);
  });

  story('a moderator removes a comment and its writer gets the reasons by mail', async (stage) => {
    const writer = await stage.newPage(as('bram@fallow-yard.example'));
    await writer.page.goto('/plans/wall-hung-tool-cabinet');
    await writer.page.getByRole('button', { name: 'Critique or ask' }).click();
    await writer.page.getByLabel('What should change').fill('Leave the guard off for all of it.');
    await writer.page.getByLabel('Why').fill('It is quicker without.');
    await writer.page.getByRole('button', { name: 'Send the critique' }).click();
    await writer.page.getByText('Leave the guard off for all of it.').waitFor();

    const other = await stage.newPage(as('tilda@plumbhollow.example'));
    await other.page.goto('/plans/wall-hung-tool-cabinet');
    await other.page.getByRole('button', { name: 'More about Bram Oxenfold’s words' }).click();
    await other.page.getByRole('menuitem', { name: 'Report it' }).click();
    await other.page.getByLabel('What is wrong').fill('Tells people to work without a guard.');
    await other.page.getByRole('button', { name: 'Send the report' }).click();
    await other.page.getByText(/Your receipt is/).waitFor();

    const moderator = await stage.newPage(as('gus@scantling.example'));
    await moderator.page.goto('/cases');
    await moderator.page
      .getByRole('button', { name: /^Case \d+/ })
      .first()
      .click();
    await moderator.page.getByRole('button', { name: 'I am on it' }).click();
    await moderator.page.getByText('You are on it.').waitFor();
    expect(await axe(moderator.page)).toEqual([]);
    await moderator.page.getByLabel('Rule broken').selectOption('S2');
    await moderator.page.getByRole('radio', { name: /Remove/ }).click();
    await moderator.page
      .getByLabel(/Statement of reasons/)
      .fill('The comment tells builders to leave the guard off.');
    await moderator.page.getByRole('button', { name: 'Give the ruling' }).click();
    await moderator.page.getByRole('heading', { name: 'Rulings' }).waitFor();

    const letter = await stage.letter('bram@fallow-yard.example', /ruling/);
    expect(letter.text).toContain('Working without a guard');
    expect(letter.text).toContain('leave the guard off');
    expect(letter.text).toContain('six months');
    await other.page.reload();
    await other.page.getByRole('heading', { level: 1, name: 'Wall-hung tool cabinet' }).waitFor();
    expect(await other.page.getByText('Leave the guard off for all of it.').count()).toBe(0);
  });
});
