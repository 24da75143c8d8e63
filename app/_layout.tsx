import { Slot } from 'expo-router';
import { DataProvider } from '../components/data/data-provider';
import { NewVersion } from '../components/service-worker/new-version';
import { Announcer } from '../components/ui/announcer';

export { RouteErrorBoundary as ErrorBoundary } from '../components/shell/error-boundary';

export default function RootLayout() {
  return (
    <DataProvider>
      <NewVersion />
      <Slot />
      <Announcer />
    </DataProvider>
  );
}
