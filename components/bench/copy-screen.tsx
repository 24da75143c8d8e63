import { useLocalSearchParams } from 'expo-router';
import { SignedIn } from '../account/signed-in';
import { ApiProblem, tell } from '../data/problems';
import { PageHead } from '../shell/page-head';
import { Page } from '../ui/layout';
import { ErrorState, LoadingLines } from '../ui/states';
import { useMounted } from '../ui/use-media';
import { useCopy } from './bench-queries';
import { Workbench } from './workbench';

/** One bench copy, step by step. */
export function CopyScreen() {
  const { copyId } = useLocalSearchParams<{ copyId: string }>();
  const mounted = useMounted();
  if (!mounted) return <Waiting />;
  return (
    <SignedIn title="Bench copy" what="A bench copy belongs to whoever started it.">
      {(me) => <LoadedCopy copyId={copyId} personId={me.id} />}
    </SignedIn>
  );
}

function Waiting() {
  return (
    <>
      <PageHead title="Bench copy" back="/bench" />
      <Page>
        <LoadingLines label="Loading the bench copy" />
      </Page>
    </>
  );
}

function LoadedCopy({ copyId, personId }: { copyId: string; personId: string }) {
  const copy = useCopy(copyId);
  if (copy.data) return <Workbench copy={copy.data} personId={personId} />;
  if (!copy.isError) return <Waiting />;
  const gone = copy.error instanceof ApiProblem && copy.error.status === 404;
  return (
    <>
      <PageHead title="Bench copy" back="/bench" />
      <Page>
        <ErrorState
          title={gone ? 'This bench copy is not here' : 'The bench copy did not come'}
          happened={gone ? 'It belongs to somebody else, or was put away.' : tell(copy.error).text}
          todo={
            gone
              ? 'Go back to your bench.'
              : 'It has not been opened on this device before. Open it once with a signal; from then on it works without.'
          }
          code={tell(copy.error).code}
          onRetry={() => void copy.refetch()}
        />
      </Page>
    </>
  );
}
