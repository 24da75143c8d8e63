import { Slot } from 'expo-router';
import { PersonBridge } from '../../components/account/person-bridge';
import { Shell } from '../../components/shell/shell';

export { RouteErrorBoundary as ErrorBoundary } from '../../components/shell/error-boundary';

export default function ShellLayout() {
  return (
    <PersonBridge>
      <Shell>
        <Slot />
      </Shell>
    </PersonBridge>
  );
}
