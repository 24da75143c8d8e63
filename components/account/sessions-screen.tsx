import { useEndSession, useSessions } from '../data/me-queries';
import { tell } from '../data/problems';
import { PageHead } from '../shell/page-head';
import { toast } from '../ui/announcer';
import { Button } from '../ui/button';
import { Page, Row, Rule, Stack } from '../ui/layout';
import { ErrorState, LoadingLines } from '../ui/states';
import { Text } from '../ui/text';
import { SignedIn } from './signed-in';

const when = (at: string) =>
  new Date(at).toLocaleString(undefined, { dateStyle: 'medium', timeStyle: 'short' });

export function SessionsScreen() {
  return (
    <SignedIn title="Where you are signed in" what="Your sessions are listed here.">
      {() => <Sessions />}
    </SignedIn>
  );
}

function Sessions() {
  const sessions = useSessions();
  const end = useEndSession();
  return (
    <>
      <PageHead title="Where you are signed in" back="/you" />
      <Page width="form">
        {sessions.isError ? (
          <ErrorState
            title="The list did not come"
            happened={tell(sessions.error).text}
            code={tell(sessions.error).code}
            onRetry={() => void sessions.refetch()}
          />
        ) : !sessions.data ? (
          <LoadingLines label="Loading your sessions" />
        ) : (
          <Stack gap={12}>
            {sessions.data.items.map((session) => (
              <Stack key={session.id} gap={12}>
                <Row justify="space-between">
                  <Stack gap={4} style={{ flexShrink: 1, alignSelf: 'auto' }}>
                    <Text weight={600}>{session.device}</Text>
                    <Text size="note" tone="ink2">
                      {session.current ? 'This one' : `Last seen ${when(session.lastSeenAt)}`}
                    </Text>
                  </Stack>
                  {session.current ? null : (
                    <Button
                      label={`End the session on ${session.device}`}
                      onPress={() =>
                        end.mutate(session.id, {
                          onError: (error) => toast({ text: tell(error).text }),
                        })
                      }
                    >
                      End it
                    </Button>
                  )}
                </Row>
                <Rule />
              </Stack>
            ))}
          </Stack>
        )}
      </Page>
    </>
  );
}
