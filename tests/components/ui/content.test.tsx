import { act, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { Figure } from '../../../components/ui/figure';
import { Heading } from '../../../components/ui/heading';
import { Progress } from '../../../components/ui/progress';
import { Prose } from '../../../components/ui/prose';
import { safeHref } from '../../../components/ui/prose-tokens';
import { EmptyState, ErrorState, LoadingLines } from '../../../components/ui/states';
import { Table } from '../../../components/ui/table';
import { TitleBlock } from '../../../components/ui/title-block';

test.each([1, 2, 3, 4, 5, 6] as const)('a heading of level %d is a real one', (level) => {
  render(<Heading level={level}>Parts and stock</Heading>);
  expect(screen.getByRole('heading', { level, name: 'Parts and stock' }).tagName).toBe(`H${level}`);
});

describe('people’s own text', () => {
  test('references are drawn by the caller, everything else by us', () => {
    render(
      <Prose
        renderReference={({ kind, id }) => <Figure figure={kind === 'dim' ? '2 3/4 in' : id} />}
      >
        {'Hold {{dim:inner_w}} on **part** {{part:B}}.'}
      </Prose>,
    );
    expect(screen.getByText('two and three quarters inches')).toBeTruthy();
    expect(screen.getByText('part')).toBeTruthy();
  });

  test('raw HTML is printed, never used', () => {
    const { container } = render(
      <Prose>{'<img src=x onerror=alert(1)> and <script>alert(1)</script>'}</Prose>,
    );
    expect(container.querySelector('img,script')).toBeNull();
    expect(container.textContent).toContain('<img src=x onerror=alert(1)>');
  });

  test('headings are put below ours', () => {
    render(<Prose headingsFrom={4}>{'# Mine\n\n#### Deep'}</Prose>);
    expect(screen.getByRole('heading', { level: 4, name: 'Mine' })).toBeTruthy();
    expect(screen.getByRole('heading', { level: 6, name: 'Deep' })).toBeTruthy();
  });

  test('lists keep their numbers', () => {
    render(<Prose>{'3. Hold it\n4. Check it'}</Prose>);
    const items = within(screen.getByRole('list')).getAllByRole('listitem');
    expect(items.map((i) => i.textContent)).toEqual(['3Hold it', '4Check it']);
  });

  test.each([
    ['https://example.org/a', true],
    ['HTTP://example.org', true],
    ['mailto:a@example.org', true],
    ['javascript:alert(1)', false],
    [' javascript:alert(1)', false],
    ['data:text/html,x', false],
    ['//example.org', false],
    ['/you/erase', false],
    ['https:alert', false],
  ])('may a text link to %s: %s', (href, may) => {
    expect(safeHref(href) !== null).toBe(may);
  });

  test('a link that may not be followed stays as words', () => {
    render(<Prose>{'[press me](javascript:alert(1))'}</Prose>);
    expect(screen.queryByRole('link')).toBeNull();
    expect(screen.getByText('press me')).toBeTruthy();
  });
});

describe('table', () => {
  interface Part {
    letter: string;
    length: string;
  }
  const rows: Part[] = [
    { letter: 'A', length: '564.2' },
    { letter: 'B', length: '9 1/4' },
  ];
  const table = (open?: (row: Part) => void) => (
    <Table
      label="Parts"
      columns={[
        { key: 'part', title: 'Part', cell: (p: Part) => p.letter },
        {
          key: 'length',
          title: 'Length',
          unit: 'mm',
          align: 'right',
          cell: (p: Part) => <Figure figure={p.length} />,
        },
      ]}
      rows={rows}
      rowKey={(p) => p.letter}
      rowState={(p) => (p.letter === 'B' ? 'chosen' : undefined)}
      onRowPress={open}
      rowLabel={(p) => `Open part ${p.letter}`}
    />
  );

  test('has the roles of one, with the unit once in the head', () => {
    render(table());
    const t = screen.getByRole('table', { name: 'Parts' });
    expect(within(t).getAllByRole('row')).toHaveLength(3);
    expect(within(t).getByRole('columnheader', { name: 'Length, mm' })).toBeTruthy();
    expect(within(t).getByRole('cell', { name: /nine and one quarter/ })).toBeTruthy();
  });

  test('a row opens once by its button and by a click anywhere on it', async () => {
    const open = jest.fn();
    render(table(open));
    await userEvent.click(screen.getByRole('button', { name: 'Open part A' }));
    expect(open).toHaveBeenCalledTimes(1);
    await userEvent.click(screen.getByText('564.2'));
    expect(open).toHaveBeenCalledTimes(2);
    act(() => screen.getByRole('button', { name: 'Open part B' }).focus());
    await userEvent.keyboard('{Enter}');
    expect(open).toHaveBeenLastCalledWith(rows[1]);
  });
});

test('a title block is terms and values', () => {
  render(<TitleBlock label="Facts" rows={[[{ label: 'Rev', value: 'C' }]]} />);
  expect(screen.getByRole('term').textContent).toBe('Rev');
  expect(screen.getByRole('definition').textContent).toBe('C');
});

describe('the other states of a screen', () => {
  test('loading is read out and busy', () => {
    render(<LoadingLines label="Loading the plan" />);
    expect(screen.getByRole('status').getAttribute('aria-busy')).toBe('true');
    expect(screen.getByText('Loading the plan')).toBeTruthy();
  });
  test('empty says what will be here', () => {
    render(<EmptyState title="Nothing on the bench">Start a bench copy from any plan.</EmptyState>);
    expect(screen.getByRole('heading', { level: 2, name: 'Nothing on the bench' })).toBeTruthy();
  });
  test('an error says what happened, what is kept, what to do, and the code', async () => {
    const retry = jest.fn();
    render(
      <ErrorState
        title="It did not go out"
        happened="No answer."
        kept="Your text."
        todo="Try again."
        code="upload/stopped"
        onRetry={retry}
      />,
    );
    const alert = screen.getByRole('alert');
    for (const part of [
      'It did not go out',
      'No answer.',
      'What is kept',
      'Your text.',
      'What to do',
      'upload/stopped',
    ]) {
      expect(alert.textContent).toContain(part);
    }
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(retry).toHaveBeenCalledTimes(1);
  });
  test.each([
    [0.62, '62'],
    [-1, '0'],
    [7, '100'],
    [NaN, '0'],
  ])('progress of %d is %s per cent', (value, shown) => {
    render(<Progress label="Uploading" value={value} />);
    expect(
      screen.getByRole('progressbar', { name: 'Uploading' }).getAttribute('aria-valuenow'),
    ).toBe(shown);
  });
});
