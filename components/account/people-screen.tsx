import { useState } from 'react';
import { roles, type Role } from '../../shared/api/accounts';
import { usePeople, useSetRoles } from '../data/me-queries';
import { tell } from '../data/problems';
import { PageHead } from '../shell/page-head';
import { toast } from '../ui/announcer';
import { Checkbox } from '../ui/checkbox';
import { Page, Row, Rule, Stack } from '../ui/layout';
import { EmptyState, ErrorState, LoadingLines } from '../ui/states';
import { Text } from '../ui/text';
import { TextField } from '../ui/text-field';
import { SignedIn } from './signed-in';

export function PeopleScreen() {
  return (
    <SignedIn title="People and roles" what="Admins grant roles here.">
      {() => <People />}
    </SignedIn>
  );
}

function People() {
  const [q, setQ] = useState('');
  const people = usePeople(q);
  const set = useSetRoles();
  const grant = (personId: string, held: readonly Role[], role: Role, on: boolean) =>
    set.mutate(
      { personId, roles: on ? [...held, role] : held.filter((r) => r !== role) },
      { onError: (error) => toast({ text: tell(error).text }) },
    );
  return (
    <>
      <PageHead title="People and roles" back="/you" />
      <Page>
        <TextField
          label="Find a person"
          type="search"
          value={q}
          onChange={setQ}
          help="By name or e-mail"
        />
        {people.isError ? (
          <ErrorState
            title="The list did not come"
            happened={tell(people.error).text}
            code={tell(people.error).code}
            onRetry={() => void people.refetch()}
          />
        ) : !people.data ? (
          <LoadingLines label="Loading people" />
        ) : people.data.items.length === 0 ? (
          <EmptyState title="Nobody found">Try another part of the name or the e-mail.</EmptyState>
        ) : (
          <Stack gap={12}>
            {people.data.items.map((person) => (
              <Stack key={person.id} gap={8}>
                <Text weight={600}>{person.displayName}</Text>
                <Text size="note" tone="ink2">
                  {person.email}
                  {person.suspendedUntil ? ' · suspended' : ''}
                </Text>
                <Row gap={16} wrap>
                  {roles.map((role) => (
                    <Checkbox
                      key={role}
                      label={`${person.displayName} is ${role}`}
                      value={person.roles.includes(role)}
                      onChange={(on) => grant(person.id, person.roles, role, on)}
                    >
                      <Text size="note">{role}</Text>
                    </Checkbox>
                  ))}
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
