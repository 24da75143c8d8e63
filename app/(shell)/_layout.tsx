import { Slot } from 'expo-router';
import { Shell } from '../../components/shell/shell';

export { RouteErrorBoundary as ErrorBoundary } from '../../components/shell/error-boundary';

export default function ShellLayout() {
  return (
    <Shell>
      <Slot />
    </Shell>
  );
}
