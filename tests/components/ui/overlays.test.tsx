import { act, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { Announcer, announce, dismissToast, toast } from '../../../components/ui/announcer';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { IconButton } from '../../../components/ui/icon-button';
import { Menu } from '../../../components/ui/menu';

function DialogSample({ give }: { give: () => void }) {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button label="Give up" onPress={() => setOpen(true)} />
      <Dialog
        open={open}
        title="Give up bench copy?"
        onClose={() => setOpen(false)}
        action={{ label: 'Give it up', danger: true, onPress: give }}
      >
        The plan stays.
      </Dialog>
    </>
  );
}

describe('dialog', () => {
  test('is named by its question, takes the focus and keeps it', async () => {
    render(<DialogSample give={jest.fn()} />);
    await userEvent.click(screen.getByRole('button', { name: 'Give up' }));
    const dialog = await screen.findByRole('dialog', { name: 'Give up bench copy?' });
    expect(dialog.contains(document.activeElement)).toBe(true);
    for (let i = 0; i < 5; i += 1) {
      await userEvent.tab();
      expect(
        dialog.contains(document.activeElement) || document.activeElement === document.body,
      ).toBe(true);
    }
  });

  test('Escape closes it and the focus goes back to where it came from', async () => {
    render(<DialogSample give={jest.fn()} />);
    const opener = screen.getByRole('button', { name: 'Give up' });
    await userEvent.click(opener);
    await screen.findByRole('dialog');
    await userEvent.keyboard('{Escape}');
    expect(screen.queryByRole('dialog')).toBeNull();
    expect(document.activeElement).toBe(opener);
  });

  test('keeping does nothing but close; the action acts', async () => {
    const give = jest.fn();
    render(<DialogSample give={give} />);
    await userEvent.click(screen.getByRole('button', { name: 'Give up' }));
    await userEvent.click(await screen.findByRole('button', { name: 'Keep it' }));
    expect(give).not.toHaveBeenCalled();
    await userEvent.click(screen.getByRole('button', { name: 'Give up' }));
    await userEvent.click(await screen.findByRole('button', { name: 'Give it up' }));
    expect(give).toHaveBeenCalledTimes(1);
  });
});

test('menu: opens, arrows move, Enter does it and closes, the focus returns', async () => {
  const copy = jest.fn();
  render(
    <Menu
      label="Plan"
      items={[
        { label: 'Print', onPress: jest.fn() },
        { label: 'Copy the link', onPress: copy },
      ]}
      trigger={(t) => <IconButton icon="more" label="More" {...t} />}
    />,
  );
  const trigger = screen.getByRole('button', { name: 'More' });
  expect(trigger.getAttribute('aria-haspopup')).toBe('menu');
  await userEvent.click(trigger);
  expect(await screen.findByRole('menu', { name: 'Plan' })).toBeTruthy();
  expect(document.activeElement?.textContent).toBe('Print');
  await userEvent.keyboard('{ArrowDown}');
  expect(document.activeElement?.textContent).toBe('Copy the link');
  await userEvent.keyboard('{Enter}');
  expect(copy).toHaveBeenCalledTimes(1);
  expect(screen.queryByRole('menu')).toBeNull();
  expect(document.activeElement).toBe(trigger);
});

describe('announcer', () => {
  test('reads politely or at once, and the same sentence twice changes the region', () => {
    render(<Announcer />);
    act(() => announce('Kept'));
    const first = screen.getByRole('status').textContent;
    act(() => announce('Kept'));
    expect(screen.getByRole('status').textContent).not.toBe(first);
    act(() => announce('Not saved', 'assertive'));
    expect(screen.getByRole('alert').textContent).toContain('Not saved');
  });

  test('a toast shows, undoes and goes', async () => {
    const undo = jest.fn();
    render(<Announcer />);
    act(() => toast({ text: 'Part D dropped.', action: { label: 'Undo', onPress: undo } }));
    await userEvent.click(screen.getByRole('button', { name: 'Undo' }));
    expect(undo).toHaveBeenCalledTimes(1);
    expect(screen.queryByRole('button', { name: 'Undo' })).toBeNull();
  });

  test('it goes by itself: later with an action', () => {
    jest.useFakeTimers();
    render(<Announcer />);
    act(() => toast('Kept'));
    act(() => jest.advanceTimersByTime(5900));
    expect(screen.getByRole('button', { name: 'Close' })).toBeTruthy();
    act(() => jest.advanceTimersByTime(200));
    expect(screen.queryByRole('button', { name: 'Close' })).toBeNull();
    act(() => dismissToast());
    jest.useRealTimers();
  });
});
