import { Slot } from 'expo-router';
import { Announcer } from '../components/ui/announcer';

export { RouteErrorBoundary as ErrorBoundary } from '../components/shell/error-boundary';

export default function RootLayout() {
  return (
    <>
      {/* DATA-PROVIDER: wrap <Slot /> in <DataProvider> of components/data/data-provider once it is there. */}
      <Slot />
      <Announcer />
    </>
  );
}
