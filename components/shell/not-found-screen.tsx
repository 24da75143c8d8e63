import { Button } from '../ui/button';
import { useRouter } from 'expo-router';
import { Page } from '../ui/layout';
import { EmptyState } from '../ui/states';
import { PageHead } from './page-head';

/** Nothing lives at this address. */
export function NotFoundScreen() {
  const router = useRouter();
  return (
    <Page>
      <PageHead title="Nothing here" />
      <EmptyState
        title="No page at this address"
        actions={
          <Button kind="primary" label="Find a plan" onPress={() => router.push('/')} wide />
        }
      >
        The plan may have been taken back, or the address has a slip in it. Nothing of yours is
        lost.
      </EmptyState>
    </Page>
  );
}
