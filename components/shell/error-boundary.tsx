import { usePathname, type ErrorBoundaryProps } from 'expo-router';
import { Link } from '../ui/link';
import { Page } from '../ui/layout';
import { ErrorState } from '../ui/states';
import { PageHead } from './page-head';

/** Shown when a screen breaks while drawing. What was typed into fields is gone; what was kept is kept. */
export function RouteErrorBoundary({ error, retry }: ErrorBoundaryProps) {
  const pathname = usePathname();
  return (
    <Page>
      <PageHead title="This page broke" />
      <ErrorState
        title="The page could not be drawn"
        happened={error.message || 'Something in it went wrong.'}
        kept="Everything you had kept is kept. What you were typing on this page is not."
        todo="Draw it again. If it breaks again, go another way and tell us the code."
        onRetry={() => void retry()}
        retryLabel="Draw it again"
        actions={<Link href="/">To the plans</Link>}
        code={`page${pathname}`}
      />
    </Page>
  );
}
