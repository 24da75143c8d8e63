import { readFileSync } from 'node:fs';
import { readEntriesFile } from '../../shared/plan/bench/entries-file';
import { baseUrl } from './harness';
import {
  atStep,
  heldIds,
  keepNote,
  keptThings,
  makeDevice,
  onServer,
  openAtBench,
  tick,
  type Device,
} from './offline-device';

const ada = { email: 'ada@scantling.example', password: 'cut once measure twice' };
let phone: Device;
beforeEach(async () => {
  phone = await makeDevice(baseUrl(), ada);
}, 30_000);
afterEach(() => phone.close());

/** Which of the entries a test held the server has, in its order; other tests use the same copy. */
const heldOnes = (stored: { entry: { id: string } }[], held: readonly string[]) =>
  ids(stored).filter((id) => held.includes(id));
const ids = (stored: { entry: { id: string } }[]) => stored.map(({ entry }) => entry.id);

describe('a session that ended while there was no signal', () => {
  it('asks for the password over the page, and then sends', async () => {
    const { page, context } = phone;
    const copyId = await openAtBench(phone, 'rolling-outfeed-cart');
    await phone.signal(false);
    await tick(phone, 1);
    await page.getByLabel('A note for yourself').fill('Not kept yet');
    const held = await heldIds(phone);
    await context.clearCookies();
    await phone.signal(true);
    const dialog = page.getByRole('dialog', { name: 'Your session has ended' });
    await dialog.getByText('One bench entry is kept on this device').waitFor();
    await dialog.getByLabel('Password', { exact: true }).fill('not the password');
    await dialog.getByRole('button', { name: 'Sign in', exact: true }).click();
    await dialog.getByRole('alert').waitFor();
    await dialog.getByLabel('Password', { exact: true }).fill(ada.password);
    await dialog.getByRole('button', { name: 'Sign in', exact: true }).click();
    await page.getByText('All sent').waitFor();
    await atStep(phone, 2);
    expect(await page.getByLabel('A note for yourself').inputValue()).toBe('Not kept yet');
    expect(heldOnes(await onServer(phone, copyId), held)).toEqual(held);
  }, 60_000);

  it('says after a reload, too, what waits, and sends it after signing in', async () => {
    const { page, context } = phone;
    const copyId = await openAtBench(phone, 'wall-hung-tool-cabinet');
    await phone.signal(false);
    await keepNote(phone, 'Kept over the end of the session.');
    const held = await heldIds(phone);
    await context.clearCookies();
    await page.close();
    await phone.signal(true);
    phone.page = await context.newPage();
    await phone.page.goto('/bench');
    await phone.page.getByRole('dialog').getByRole('button', { name: 'Close' }).click();
    await phone.page.reload();
    await phone.page.getByRole('heading', { name: 'Your session has ended' }).waitFor();
    await phone.page.getByText('One bench entry is kept on this device').waitFor();
    await phone.page.getByRole('button', { name: 'Sign in' }).click();
    await phone.page.waitForURL(/\/sign-in\?/);
    expect(await phone.page.getByLabel('E-mail').inputValue()).toBe(ada.email);
    await phone.page.getByLabel('Password', { exact: true }).fill(ada.password);
    await phone.page.getByRole('button', { name: 'Sign in', exact: true }).click();
    await phone.page.waitForURL('**/bench');
    await phone.page.getByRole('heading', { level: 1, name: 'Bench' }).waitFor();
    await phone.page.goto(`/bench/${copyId}`);
    await phone.page.getByText('All sent').waitFor();
    expect(heldOnes(await onServer(phone, copyId), held)).toEqual(held);
  }, 60_000);
});

describe('signing out with unsent entries', () => {
  it('saves them as a file, clears the device, and takes the file in again', async () => {
    const { page, context } = phone;
    const copyId = await openAtBench(phone, 'shooting-board');
    await context.route('**/api/bench/*/entries/*', (route) => route.fulfill({ status: 503 }));
    await keepNote(phone, 'Written before leaving.');
    await tick(phone, 1);
    const held = await heldIds(phone);
    expect(held).toHaveLength(2);

    await page.goto('/you');
    await page.getByRole('button', { name: 'Sign out' }).click();
    const dialog = page.getByRole('dialog');
    await dialog.getByRole('button', { name: 'Discard 2 and sign out' }).waitFor();
    await dialog.getByRole('button', { name: 'Send now' }).click();
    await dialog.getByText('No signal. They are still kept here.').waitFor();
    const coming = page.waitForEvent('download');
    await dialog.getByRole('button', { name: 'Save as a file' }).click();
    const file = await (await coming).path();
    const read = readEntriesFile(readFileSync(file, 'utf8'));
    expect(read.ok && ids(read.entries)).toEqual(held);

    await dialog.getByRole('button', { name: 'Sign out', exact: true }).click();
    await page.waitForURL((url) => url.pathname === '/');
    expect(await heldIds(phone)).toEqual([]);
    const kept = await keptThings(phone);
    expect(kept.caches).toEqual([]);
    expect(kept.answers).not.toContain(copyId);

    await context.unroute('**/api/bench/*/entries/*');
    await page.goto('/sign-in?next=/you');
    await page.getByLabel('E-mail').fill(ada.email);
    await page.getByLabel('Password', { exact: true }).fill(ada.password);
    await page.getByRole('button', { name: 'Sign in', exact: true }).click();
    await page.waitForURL('**/you');
    const choosing = page.waitForEvent('filechooser');
    await page.getByRole('button', { name: 'Take in saved bench entries' }).click();
    await (
      await choosing
    ).setFiles({ name: 'entries.json', mimeType: 'application/json', buffer: readFileSync(file) });
    await page.getByText('2 entries taken in.').first().waitFor();
    await page.goto(`/bench/${copyId}`);
    await page.getByText('All sent').waitFor();
    expect(heldOnes(await onServer(phone, copyId), held)).toEqual(held);
  }, 60_000);

  it('sends them when the signal is there', async () => {
    const { page, context } = phone;
    const copyId = await openAtBench(phone, 'wall-hung-tool-cabinet');
    await context.route('**/api/bench/*/entries/*', (route) => route.fulfill({ status: 503 }));
    await tick(phone, 1);
    const held = await heldIds(phone);
    await page.goto('/you');
    await page.getByRole('button', { name: 'Sign out' }).click();
    await context.unroute('**/api/bench/*/entries/*');
    const dialog = page.getByRole('dialog');
    await dialog.getByRole('button', { name: 'Send now' }).click();
    await page.getByRole('dialog', { name: 'All is sent' }).waitFor();
    expect(heldOnes(await onServer(phone, copyId), held)).toEqual(held);
    await dialog.getByRole('button', { name: 'Sign out', exact: true }).click();
    await page.waitForURL((url) => url.pathname === '/');
    expect(await heldIds(phone)).toEqual([]);
  }, 60_000);
});
