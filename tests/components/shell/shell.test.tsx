import { act, render, screen, within } from '@testing-library/react';
import { type ReactNode } from 'react';
import { Announcer } from '../../../components/ui/announcer';
import { PageHead } from '../../../components/shell/page-head';
import { Shell } from '../../../components/shell/shell';
import { ShellPersonProvider } from '../../../components/shell/shell-person';

let mockPath = '/';
jest.mock('expo-router', () => ({
  usePathname: () => mockPath,
  Link: ({ href, children, ...rest }: { href: string; children: ReactNode }) => {
    const { 'aria-current': current, 'aria-label': label } = rest as Record<
      string,
      string | undefined
    >;
    return (
      <a href={href} aria-current={current as 'page'} aria-label={label}>
        {children}
      </a>
    );
  },
}));
jest.mock('expo-router/head', () => ({
  __esModule: true,
  default: ({ children }: { children: ReactNode }) => <>{children}</>,
}));

const tilda = {
  displayName: 'Tilda Spokeshave',
  shopName: 'Plumb Hollow',
  roles: ['creator'] as const,
  counts: { bench: 2 },
};

function show(path: string) {
  mockPath = path;
  return render(
    <ShellPersonProvider value={tilda}>
      <Shell>
        <PageHead title="Bench" />
      </Shell>
      <Announcer />
    </ShellPersonProvider>,
  );
}

beforeAll(() => {
  window.scrollTo = jest.fn();
});

test('landmarks: skip link to main, navigation with the current place', () => {
  show('/bench');
  const main = screen.getByRole('main');
  expect(screen.getByRole('link', { name: 'To the content' }).getAttribute('href')).toBe(
    `#${main.id}`,
  );
  const [rail] = screen.getAllByRole('navigation', { name: 'Places' });
  const current = within(rail as HTMLElement)
    .getAllByRole('link')
    .filter((l) => l.getAttribute('aria-current') === 'page');
  expect(current.map((l) => l.getAttribute('href'))).toEqual(['/bench']);
  expect(rail?.textContent).toContain('Plumb Hollow');
  expect(rail?.textContent).toContain('Signed in as Tilda Spokeshave');
});

test('a bench copy has the screen to itself', () => {
  show('/bench/0198');
  expect(screen.queryByRole('navigation')).toBeNull();
  expect(screen.getByRole('main')).toBeTruthy();
});

test('the title is the document’s', () => {
  show('/bench');
  expect(document.querySelector('title')?.textContent).toBe('Bench · Scantling');
});

test('arriving on a later page reads its title and moves the focus to its h1', () => {
  // jsdom lays nothing out; the shell asks whether the heading is on screen.
  Element.prototype.getClientRects = () => [{}] as unknown as DOMRectList;
  const { rerender } = show('/bench');
  act(() =>
    rerender(
      <ShellPersonProvider value={tilda}>
        <Shell>
          <PageHead key="next" title="Shooting board" />
        </Shell>
        <Announcer />
      </ShellPersonProvider>,
    ),
  );
  expect(screen.getByRole('status').textContent).toContain('Shooting board');
  expect(document.activeElement?.tagName).toBe('H1');
  expect(document.activeElement?.textContent).toBe('Shooting board');
});
