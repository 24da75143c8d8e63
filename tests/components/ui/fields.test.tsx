import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { accepts, FilePick, refusal } from '../../../components/ui/file-pick';
import {
  NumberFigureField,
  PasswordField,
  TextArea,
  TextField,
} from '../../../components/ui/text-field';

test('a field is named by its label and described by help and error', () => {
  render(
    <TextField
      label="E-mail"
      value=""
      onChange={jest.fn()}
      help="One letter to confirm it."
      error="No @ in it. Write name@place."
    />,
  );
  const input = screen.getByLabelText('E-mail');
  expect(input.getAttribute('aria-invalid')).toBe('true');
  const described = (input.getAttribute('aria-describedby') ?? '')
    .split(' ')
    .map((id) => document.getElementById(id)?.textContent);
  expect(described).toEqual(['No @ in it. Write name@place.', 'One letter to confirm it.']);
});

test('a hidden label still names it', () => {
  render(<TextField label="Find a plan" hideLabel value="" onChange={jest.fn()} />);
  expect(screen.getByLabelText('Find a plan')).toBeTruthy();
});

test('typing reports the text; read only does not take it', async () => {
  const change = jest.fn();
  render(<NumberFigureField label="Thickness" unit="mm" value="" onChange={change} />);
  await userEvent.type(screen.getByLabelText('Thickness'), '1');
  expect(change).toHaveBeenCalledWith('1');

  const locked = jest.fn();
  render(<NumberFigureField label="Derived" value="564.8" onChange={locked} readOnly />);
  await userEvent.type(screen.getByLabelText('Derived'), '9');
  expect(locked).not.toHaveBeenCalled();
});

test('a password is shown on request, and the button says what it does', async () => {
  render(<PasswordField label="Password" value="mortise and tenon" onChange={jest.fn()} />);
  const input = screen.getByLabelText<HTMLInputElement>('Password');
  expect(input.type).toBe('password');
  expect(input.getAttribute('autocomplete')).toBe('current-password');
  await userEvent.click(screen.getByRole('button', { name: 'Show password' }));
  expect(input.type).toBe('text');
  await userEvent.click(screen.getByRole('button', { name: 'Hide password' }));
  expect(input.type).toBe('password');
});

test('the counter comes near the end and an overlong text is refused in words', async () => {
  function Sample() {
    const [text, setText] = useState('twelve chars');
    return <TextArea label="Why" limit={20} value={text} onChange={setText} />;
  }
  render(<Sample />);
  expect(screen.queryByText(/left$/)).toBeNull();
  const area = screen.getByLabelText('Why');
  await userEvent.type(area, ' and so');
  expect(screen.getByText('1 left')).toBeTruthy();
  await userEvent.type(area, ' on');
  expect(screen.getByText('2 too many')).toBeTruthy();
  expect(screen.getByText('2 too many. Shorten the text to 20 characters.')).toBeTruthy();
});

describe('files', () => {
  const file = (name: string, type: string, size = 10) => {
    const f = new File(['x'], name, { type });
    Object.defineProperty(f, 'size', { value: size });
    return f;
  };

  test.each([
    ['clip.VTT', '', '.vtt,.srt', true],
    ['photo.png', 'image/png', 'image/*', true],
    ['photo.png', 'image/png', 'image/jpeg', false],
    ['notes.txt', 'text/plain', '.vtt', false],
    ['any.bin', '', undefined, true],
  ])('%s (%s) for %s: %s', (name, type, accept, taken) => {
    expect(accepts(file(name, type), accept)).toBe(taken);
  });

  test('refusals say what happened, that nothing was taken, and what to do', () => {
    expect(refusal([file('notes.txt', 'text/plain')], { accept: '.vtt' })).toBe(
      'notes.txt is not a file of that kind. Nothing was taken. Choose .vtt.',
    );
    expect(
      refusal([file('clip.mov', '', 30 * 1024 * 1024)], { maxBytes: 20 * 1024 * 1024 }),
    ).toContain('the most is 20 MB');
    expect(refusal([file('a.vtt', ''), file('b.vtt', '')], {})).toContain('One file at a time');
    expect(refusal([file('a.vtt', ''), file('b.vtt', '')], { multiple: true })).toBeUndefined();
  });

  test('a wrong file is refused with the reason, a right one handed on', async () => {
    const take = jest.fn();
    const { container } = render(
      <FilePick label="Choose a caption file" accept=".vtt" onFiles={take} />,
    );
    const input = container.querySelector('input') as HTMLInputElement;
    const user = userEvent.setup({ applyAccept: false });
    await user.upload(input, file('notes.txt', 'text/plain'));
    expect(take).not.toHaveBeenCalled();
    expect(screen.getByText(/Nothing was taken/)).toBeTruthy();
    await user.upload(input, file('clip.vtt', 'text/vtt'));
    expect(take).toHaveBeenCalledTimes(1);
    expect(screen.queryByText(/Nothing was taken/)).toBeNull();
  });
});
