import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { Checkbox, Switch } from '../../../components/ui/checkbox';
import { RadioGroup, SegmentedControl } from '../../../components/ui/radio-group';
import { Select } from '../../../components/ui/select';
import { TabPanel, Tabs } from '../../../components/ui/tabs';

describe.each([
  ['checkbox', Checkbox],
  ['switch', Switch],
] as const)('%s', (role, Control) => {
  function Sample() {
    const [on, setOn] = useState(false);
    return <Control label="mail me" value={on} onChange={setOn} help="Once a day at most." />;
  }
  const state = () => screen.getByRole(role, { name: 'mail me' }).getAttribute('aria-checked');

  test.each([
    ['Space', ' '],
    ['Enter', '{Enter}'],
  ])('%s turns it over, once', async (_, key) => {
    render(<Sample />);
    await userEvent.tab();
    await userEvent.keyboard(key);
    expect(state()).toBe('true');
    await userEvent.keyboard(key);
    expect(state()).toBe('false');
  });

  test('a click on the words does too', async () => {
    render(<Sample />);
    await userEvent.click(screen.getByText('mail me'));
    expect(state()).toBe('true');
  });

  test('its help belongs to it', () => {
    render(<Sample />);
    const id = screen.getByRole(role).getAttribute('aria-describedby') ?? '';
    expect(document.getElementById(id)?.textContent).toBe('Once a day at most.');
  });
});

test('a checkbox of some says mixed', () => {
  render(<Checkbox label="all" value="mixed" onChange={jest.fn()} />);
  expect(screen.getByRole('checkbox').getAttribute('aria-checked')).toBe('mixed');
});

const options = [
  { value: 'tape', label: 'tape' },
  { value: 'rule', label: 'rule', disabled: true },
  { value: 'calipers', label: 'calipers' },
] as const;
type Tool = (typeof options)[number]['value'];

describe.each([
  ['RadioGroup', RadioGroup],
  ['SegmentedControl', SegmentedControl],
] as const)('%s', (_, Control) => {
  function Sample({ start = null }: { start?: Tool | null }) {
    const [tool, setTool] = useState<Tool | null>(start);
    return <Control<Tool> label="Instrument" options={options} value={tool} onChange={setTool} />;
  }
  const chosen = () =>
    screen.getAllByRole('radio').find((r) => r.getAttribute('aria-checked') === 'true')
      ?.textContent;

  test('is one tab stop, at the chosen one', async () => {
    render(<Sample start="calipers" />);
    await userEvent.tab();
    expect(document.activeElement?.textContent).toBe('calipers');
    await userEvent.tab();
    expect(document.activeElement).toBe(document.body);
  });

  test('arrows choose, go round, and pass by what is disabled', async () => {
    render(<Sample start="tape" />);
    await userEvent.tab();
    await userEvent.keyboard('{ArrowRight}');
    expect(chosen()).toBe('calipers');
    expect(document.activeElement?.textContent).toBe('calipers');
    await userEvent.keyboard('{ArrowDown}');
    expect(chosen()).toBe('tape');
    await userEvent.keyboard('{End}');
    expect(chosen()).toBe('calipers');
  });

  test('Space chooses the one in focus where nothing is chosen', async () => {
    render(<Sample />);
    await userEvent.tab();
    await userEvent.keyboard(' ');
    expect(chosen()).toBe('tape');
  });
});

test('tabs: arrows move and show, the panel belongs to its tab', async () => {
  const tabs = [
    { value: 'clip', label: 'Clip' },
    { value: 'steps', label: 'Steps' },
  ] as const;
  function Sample() {
    const [at, setAt] = useState<'clip' | 'steps'>('clip');
    return (
      <>
        <Tabs label="Parts of the draft" id="t" tabs={tabs} value={at} onChange={setAt} />
        <TabPanel id="t" value={at}>
          <></>
        </TabPanel>
      </>
    );
  }
  render(<Sample />);
  await userEvent.tab();
  await userEvent.keyboard('{ArrowRight}');
  expect(screen.getByRole('tab', { name: 'Steps' }).getAttribute('aria-selected')).toBe('true');
  expect(screen.getByRole('tabpanel', { name: 'Steps' })).toBeTruthy();
});

test('a select is the browser’s own, named by its label, with its error read', async () => {
  const change = jest.fn();
  render(
    <Select
      label="Rule broken"
      value=""
      placeholder="Choose a rule"
      onChange={change}
      options={[{ value: 's2', label: 'S2. Working without a guard' }]}
      error="Say which rule. Your text is kept."
    />,
  );
  const select = screen.getByRole('combobox', { name: 'Rule broken' });
  expect(select.getAttribute('aria-invalid')).toBe('true');
  await userEvent.selectOptions(select, 's2');
  expect(change).toHaveBeenCalledWith('s2');
});
