import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { Button } from '../../../components/ui/button';
import { Form } from '../../../components/ui/form';
import { IconButton } from '../../../components/ui/icon-button';
import { Link } from '../../../components/ui/link';
import { Tag } from '../../../components/ui/tag';
import { TextField } from '../../../components/ui/text-field';

test.each(['Enter', ' '])('a button is pressed by %j', async (key) => {
  const press = jest.fn();
  render(<Button label="Take reading" onPress={press} />);
  await userEvent.tab();
  await userEvent.keyboard(key === ' ' ? ' ' : '{Enter}');
  expect(press).toHaveBeenCalledTimes(1);
});

test('a working button says so and ignores the press', async () => {
  const press = jest.fn();
  render(<Button label="Send" busy busyLabel="Sending" onPress={press} />);
  const button = screen.getByRole('button', { name: 'Send' });
  expect(button.getAttribute('aria-busy')).toBe('true');
  expect(button.textContent).toContain('Sending');
  await userEvent.click(button);
  expect(press).not.toHaveBeenCalled();
});

test('a disabled button is out of the tab order and does nothing', async () => {
  const press = jest.fn();
  render(<Button label="Again" disabled onPress={press} />);
  await userEvent.tab();
  expect(document.activeElement).toBe(document.body);
  screen.getByRole('button', { name: 'Again' }).click();
  expect(press).not.toHaveBeenCalled();
});

test('an icon button is named by its label', () => {
  render(<IconButton icon="camera" label="Take a photo" pressed />);
  expect(screen.getByRole('button', { name: 'Take a photo' }).getAttribute('aria-pressed')).toBe(
    'true',
  );
});

test('a filter tag is a pressed button', async () => {
  const press = jest.fn();
  render(<Tag label="given" kind="on" onPress={press} />);
  const tag = screen.getByRole('button', { name: 'given' });
  expect(tag.getAttribute('aria-pressed')).toBe('true');
  await userEvent.click(tag);
  expect(press).toHaveBeenCalledTimes(1);
});

describe('form', () => {
  const field = (onChange = jest.fn()) => (
    <TextField label="E-mail" type="email" value="a@b.example" onChange={onChange} />
  );

  test('Enter in a field sends it', async () => {
    const send = jest.fn();
    render(
      <Form label="Sign in" onSubmit={send}>
        {field()}
        <Button submit label="Sign in" />
      </Form>,
    );
    await userEvent.type(screen.getByLabelText('E-mail'), '{Enter}');
    expect(send).toHaveBeenCalledTimes(1);
  });

  test('the submit button sends it once', async () => {
    const send = jest.fn();
    render(
      <Form label="Sign in" onSubmit={send}>
        {field()}
        <Button submit label="Go in" />
      </Form>,
    );
    await userEvent.click(screen.getByRole('button', { name: 'Go in' }));
    expect(send).toHaveBeenCalledTimes(1);
  });
});

describe('links outside', () => {
  test('open a new tab, say so, and give nothing away', () => {
    render(<Link href="https://example.org/tape">a tape</Link>);
    const link = screen.getByRole('link', { name: /^a tape\s?\(opens in a new tab\)$/ });
    expect(link.getAttribute('target')).toBe('_blank');
    expect(link.getAttribute('rel')).toContain('noopener');
  });
  test('mail does not', () => {
    render(<Link href="mailto:shop@example.org">write</Link>);
    expect(screen.getByRole('link', { name: 'write' }).getAttribute('target')).toBeNull();
  });
});
