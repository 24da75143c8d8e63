import { useLocalSearchParams } from 'expo-router';
import { tell } from '../data/problems';
import { ApiProblem } from '../data/problems';
import { PageHead } from '../shell/page-head';
import { Page } from '../ui/layout';
import { ErrorState, LoadingLines } from '../ui/states';
import { useMounted } from '../ui/use-media';
import { PlanContent } from './plan-content';
import { usePlan } from './plan-queries';

/** The plan page: error, loading or the plan. */
export function PlanScreen() {
  const { slug, rev } = useLocalSearchParams<{ slug: string; rev?: string }>();
  const mounted = useMounted();
  const plan = usePlan(slug, rev);
  if (mounted && plan.data) return <PlanContent page={plan.data} />;
  const gone = plan.error instanceof ApiProblem && plan.error.status === 404;
  return (
    <>
      <PageHead title="Plan" back="/" />
      <Page>
        {mounted && plan.isError ? (
          <ErrorState
            title={gone ? 'This plan is not here' : 'The plan did not come'}
            happened={tell(plan.error).text}
            todo={gone ? 'Its maker may have taken it back. Look for another plan.' : undefined}
            code={tell(plan.error).code}
            onRetry={() => void plan.refetch()}
          />
        ) : (
          <LoadingLines label="Loading the plan" lines={8} />
        )}
      </Page>
    </>
  );
}
