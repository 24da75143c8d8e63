import { usePathname } from 'expo-router';
import { useState, type ReactNode } from 'react';
import { type Me } from '../../shared/api/accounts';
import { useMe } from '../data/me-queries';
import { PageHead } from '../shell/page-head';
import { Button } from '../ui/button';
import { Page, Row } from '../ui/layout';
import { EmptyState, ErrorState, LoadingLines } from '../ui/states';
import { useRouter, type Href } from 'expo-router';
import { useQueryClient } from '@tanstack/react-query';
import { lastPerson } from '../data/last-person';
import { keys } from '../data/query-client';
import { SessionEnded, useWaitingWords } from './session-ended';

export interface SignedInProps {
  /** Title of the page while nobody is known. */
  title: string;
  /** What the place is for, said to those who are not signed in. */
  what: string;
  children: (me: Me) => ReactNode;
}

/** Shows its content to a person; offers signing in to nobody; never sends anybody away for lack of signal. */
export function SignedIn({ title, what, children }: SignedInProps) {
  const { me, known, failed } = useMe();
  const client = useQueryClient();
  const [before, setBefore] = useState<Me | null>(null);
  if (me && me !== before) setBefore(me);
  if (me) return children(me);
  // Nobody loses the page they are working on because the server has forgotten them meanwhile.
  if (before && lastPerson()?.id === before.id) {
    return (
      <>
        {children(before)}
        {known ? <SessionEnded person={before} /> : null}
      </>
    );
  }
  return (
    <>
      <PageHead title={title} />
      <Page>
        {known ? (
          <SignInFirst what={what} />
        ) : failed ? (
          <ErrorState
            title="No signal"
            happened="The server did not answer, and nobody has signed in on this device yet."
            todo="Try again when the signal is back."
            onRetry={() => void client.invalidateQueries({ queryKey: keys.me })}
            code="signal/none"
          />
        ) : (
          <LoadingLines label={`Loading: ${title}`} />
        )}
      </Page>
    </>
  );
}

function SignInFirst({ what }: { what: string }) {
  const router = useRouter();
  const path = usePathname();
  const waiting = useWaitingWords(lastPerson()?.id);
  return (
    <EmptyState
      title={waiting ? 'Your session has ended' : 'Sign in first'}
      actions={
        <Row gap={12} wrap>
          <Button
            kind="primary"
            label="Sign in"
            onPress={() => router.push(`/sign-in?next=${encodeURIComponent(path)}` as Href)}
          />
          <Button label="Make an account" onPress={() => router.push('/sign-up')} />
        </Row>
      }
    >
      {waiting || what}
    </EmptyState>
  );
}
