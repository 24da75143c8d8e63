import { baseUrl } from './harness';
import {
  atStep,
  goTo,
  heldIds,
  keepNote,
  makeDevice,
  onServer,
  openAtBench,
  seeReadings,
  takeReadings,
  tick,
  until,
  type Device,
} from './offline-device';

const gus = { email: 'gus@scantling.example', password: 'cut once measure twice' };
const devices: Device[] = [];
const device = async (as = gus): Promise<Device> => {
  const made = await makeDevice(baseUrl(), as);
  devices.push(made);
  return made;
};
afterEach(async () => {
  await Promise.all(devices.splice(0).map((each) => each.close()));
});

const kinds = (stored: { entry: { kind: string } }[]) => {
  const count: Record<string, number> = {};
  for (const { entry } of stored) count[entry.kind] = (count[entry.kind] ?? 0) + 1;
  return count;
};

/** Everything made offline below is on the screen. */
async function allThere(phone: Device, dimension: string): Promise<void> {
  const { page } = phone;
  await atStep(phone, 4);
  await page.getByText('No signal. 10 kept on this device').waitFor();
  await page.getByText('The second sheet is bowed.').waitFor();
  await goTo(phone, 7);
  await page.getByRole('button', { name: 'End it' }).waitFor();
  await goTo(phone, 1);
  await seeReadings(phone, dimension, 5);
}

describe('at the bench with no signal', () => {
  it('keeps all that is done through reloads and a restart, and sends each exactly once', async () => {
    const phone = await device();
    const copyId = await openAtBench(phone, 'rolling-outfeed-cart');
    await phone.signal(false);
    await phone.page.reload();
    await atStep(phone, 1);

    const dimension = await takeReadings(phone, ['34', '34 1/8', '34 1/16', '34', '33 15/16']);
    for (const step of [1, 2, 3]) await tick(phone, step);
    await keepNote(phone, 'The second sheet is bowed.');
    await goTo(phone, 7);
    await phone.page.getByRole('button', { name: 'Start the wait' }).click();
    await phone.page.getByRole('button', { name: 'End it' }).waitFor();

    await phone.page.reload();
    await allThere(phone, dimension);
    await phone.restart();
    await phone.page.goto(`/bench/${copyId}`);
    await allThere(phone, dimension);
    const held = await heldIds(phone);
    expect(new Set(held).size).toBe(10);

    await phone.signal(true);
    await phone.page.getByText('All sent').waitFor();
    const stored = await onServer(phone, copyId);
    expect(stored.map(({ entry }) => entry.id)).toEqual(held);
    expect(kinds(stored)).toEqual({ reading: 5, tick: 3, note: 1, 'wait-start': 1 });
  }, 120_000);

  it('plays the clip from the device', async () => {
    const phone = await device();
    await openAtBench(phone, 'rolling-outfeed-cart');
    await phone.signal(false);
    await phone.page.reload();
    await until(phone.page, 'document.querySelector("video")?.readyState >= 2');
    const part = await phone.page.evaluate<[number, string, number]>(
      `fetch(document.querySelector('video').currentSrc, { headers: { Range: 'bytes=100-199' } })
        .then(async (r) => [r.status, r.headers.get('content-range').split('/')[0], (await r.blob()).size])`,
    );
    expect(part).toEqual([206, 'bytes 100-199', 100]);
  }, 60_000);

  it('stores once what was sent twice because the answer was lost on its way', async () => {
    const phone = await device();
    const copyId = await openAtBench(phone, 'wall-hung-tool-cabinet');
    await phone.signal(false);
    await takeReadings(phone, ['18', '18.1', '18.2']);
    await tick(phone, 1);
    const held = await heldIds(phone);
    let sent = 0;
    let lost = () => undefined as void;
    const answerLost = new Promise<void>((resolve) => (lost = resolve));
    await phone.context.route('**/api/bench/*/entries/*', async (route) => {
      sent += 1;
      if (sent === 2) {
        await route.fetch();
        await route.abort('connectionreset');
        lost();
      } else await route.continue();
    });
    await phone.signal(true);
    await answerLost;
    await phone.page.getByText('Sending 3').waitFor();
    expect(await onServer(phone, copyId)).toHaveLength(2);

    await phone.page.reload();
    await phone.page.getByText('All sent').waitFor();
    expect((await onServer(phone, copyId)).map(({ entry }) => entry.id)).toEqual(held);
    expect(sent).toBe(5);
  }, 60_000);

  it('merges what two devices did on one bench copy', async () => {
    const [phone, tablet] = await Promise.all([device(), device()]);
    const copyId = await openAtBench(phone, 'shooting-board');
    await openAtBench(tablet, 'shooting-board');
    await phone.signal(false);
    await tablet.signal(false);
    const dimension = await takeReadings(phone, ['11/16']);
    await tick(phone, 1);
    await keepNote(tablet, 'Written on the tablet.');
    await tick(tablet, 1);
    await tick(tablet, 2);
    const held = [...(await heldIds(phone)), ...(await heldIds(tablet))];
    await phone.signal(true);
    await tablet.signal(true);
    for (const each of [phone, tablet]) await each.page.getByText('All sent').waitFor();
    const stored = (await onServer(phone, copyId)).map(({ entry }) => entry.id);
    expect([...stored].sort()).toEqual([...held].sort());

    for (const each of [phone, tablet]) {
      await each.page.reload();
      await goTo(each, 1);
      await each.page.getByText('Written on the tablet.').waitFor();
      await each.page.getByRole('button', { name: 'Not done after all' }).waitFor();
      await seeReadings(each, dimension, 1);
    }
  }, 120_000);
});
