import { PersonBridge } from '../components/account/person-bridge';
import { NotFoundScreen } from '../components/shell/not-found-screen';
import { Shell } from '../components/shell/shell';

export default function NotFound() {
  return (
    <PersonBridge>
      <Shell>
        <NotFoundScreen />
      </Shell>
    </PersonBridge>
  );
}
