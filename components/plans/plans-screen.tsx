import { useDeferredValue, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { tell } from '../data/problems';
import { PageHead } from '../shell/page-head';
import { Button } from '../ui/button';
import { Page } from '../ui/layout';
import { Select } from '../ui/select';
import { EmptyState, ErrorState, LoadingLines } from '../ui/states';
import { Text } from '../ui/text';
import { TextField } from '../ui/text-field';
import { PlanRow } from './plan-row';
import { webStyle } from '../ui/web-style';
import { usePlans, type PlanFilter } from './plan-queries';

const start: PlanFilter = { q: '', sort: 'newest' };
const times = [
  { value: 'any', label: 'any time' },
  { value: '120', label: 'up to 2 hours' },
  { value: '240', label: 'up to 4 hours' },
  { value: '480', label: 'up to a day' },
] as const;
const skills = [
  { value: 'any', label: 'any skill' },
  { value: 'first', label: 'a first build' },
  { value: 'some', label: 'some practice' },
  { value: 'practised', label: 'practised hands' },
] as const;
type SkillChoice = (typeof skills)[number]['value'];
const sorts = [
  { value: 'newest', label: 'newest first' },
  { value: 'most-built', label: 'most built first' },
  { value: 'shortest', label: 'shortest first' },
] as const;
const shops = [
  { value: 'any', label: 'any shop' },
  { value: 'drill', label: 'hand tools and a drill' },
  { value: 'drill,circular-saw,track-saw', label: 'no machines that stand' },
] as const;

/** Browse and search. */
export function PlansScreen() {
  const [filter, setFilter] = useState(start);
  const asked = useDeferredValue(filter);
  const plans = usePlans(asked);
  const cards = plans.data?.pages.flatMap((p) => p.items) ?? [];
  const set = (part: Partial<PlanFilter>) => setFilter({ ...filter, ...part });
  return (
    <>
      <PageHead
        title="Plans"
        sub="cut to, not scrub through"
        description="Plans of workshop makers that you can measure against."
      />
      <Page>
        <TextField
          label="Find a plan"
          type="search"
          value={filter.q}
          onChange={(q) => set({ q })}
          help="A word of the title, a part, a tool"
        />
        <View style={styles.filters}>
          <Select
            label="Time with waits"
            options={times}
            value={String(filter.maxMinutes ?? 'any') as '120'}
            onChange={(v) => set({ maxMinutes: Number(v) || undefined })}
          />
          <Select
            label="Skill"
            options={skills}
            value={(filter.skill ?? 'any') satisfies SkillChoice}
            onChange={(v) => set({ skill: v === 'any' ? undefined : v })}
          />
          <Select
            label="Shop"
            options={shops}
            value={(filter.machines ?? 'any') as 'drill'}
            onChange={(v) => set({ machines: v === 'any' ? undefined : v })}
          />
          <Select
            label="Order"
            options={sorts}
            value={filter.sort}
            onChange={(sort) => set({ sort })}
          />
        </View>
        {plans.isError ? (
          <ErrorState
            title="The plans did not come"
            happened={tell(plans.error).text}
            code={tell(plans.error).code}
            onRetry={() => void plans.refetch()}
          />
        ) : !plans.data ? (
          <LoadingLines label="Loading the plans" lines={6} />
        ) : cards.length === 0 ? (
          <EmptyState
            title="No plan fits"
            actions={<Button label="Clear the search" onPress={() => setFilter(start)} />}
          >
            Plans that fit your words and filters stand here. Try fewer words.
          </EmptyState>
        ) : (
          <View role="list" aria-label="Plans">
            {cards.map((card) => (
              <PlanRow key={card.id} card={card} />
            ))}
          </View>
        )}
        {plans.hasNextPage ? (
          <Button
            label="Show more"
            onPress={() => void plans.fetchNextPage()}
            busy={plans.isFetchingNextPage}
          />
        ) : null}
        <Text size="small" tone="ink2">
          Follow your machine’s manual, local codes and licensed practice. A check that holds is not
          a promise of safety.
        </Text>
      </Page>
    </>
  );
}

const styles = StyleSheet.create({
  filters: webStyle({
    display: 'grid',
    gridTemplateColumns: 'repeat(auto-fill, minmax(150px, 1fr))',
    gap: '12px',
  }),
});
