import { useLocalSearchParams } from 'expo-router';
import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { keepInput, keptInput } from '../data/kept-inputs';
import { useMe } from '../data/me-queries';
import { usePreferences } from '../data/preferences';
import { PageHead } from '../shell/page-head';
import { Banner } from '../ui/banner';
import { Figure } from '../ui/figure';
import { Link } from '../ui/link';
import { Page, Row, Rule, Stack } from '../ui/layout';
import { SegmentedControl } from '../ui/radio-group';
import { EmptyState } from '../ui/states';
import { Text } from '../ui/text';
import { colour, line } from '../ui/tokens';
import { useMounted } from '../ui/use-media';
import { VerdictShape, verdictLook } from '../ui/verdict';
import { AidFields } from './aid-fields';
import { readForm, type Units, type Values } from './form-values';
import { type AidSays, type AnyScreen, type Worked } from './screen';
import { screens } from './screens';
import { SetUps } from './set-ups';
import { showFor } from './show';

/** One aid by its address. */
export function AidScreen() {
  const { aid } = useLocalSearchParams<{ aid: string }>();
  const [{ units }] = usePreferences();
  const mounted = useMounted();
  const screen = screens.find((each) => each.aid.id === aid);
  if (!screen) {
    return (
      <>
        <PageHead title="No such aid" />
        <Page>
          <EmptyState title="No such aid" actions={<Link href="/aids">All bench aids</Link>}>
            {mounted ? `There is no aid ${aid}.` : 'Looking for it.'}
          </EmptyState>
        </Page>
      </>
    );
  }
  return (
    <>
      <PageHead title={screen.aid.title} description={screen.aid.what} />
      <Page>
        <Text tone="ink2" size="lead">
          {screen.aid.what}
        </Text>
        {mounted ? (
          <Working key={`${screen.aid.id}:${units}`} screen={screen} units={units} />
        ) : null}
      </Page>
    </>
  );
}

function Working({ screen, units }: { screen: AnyScreen; units: Units }) {
  const { aid } = screen;
  const [preferences] = usePreferences();
  const { me } = useMe();
  const [decimals, setDecimals] = useState(false);
  const [values, setValues] = useState<Values>(
    () => keptInput(aid.id, units) ?? screen.start[units],
  );
  const change = (next: Values) => {
    setValues(next);
    keepInput(aid.id, units, next);
  };
  const parts = screen.parts(values, units);
  const { input, errors } = readForm(parts, values, units);
  const wrong = Object.keys(errors).length > 0;
  const worked = wrong ? null : screen.work(input, showFor(preferences, decimals));
  const refusal = worked && !worked.ok ? worked : null;
  return (
    <Stack gap={24}>
      {aid.caution ? <Banner kind="risk">{aid.caution}</Banner> : null}
      {worked?.ok ? worked.drawing : null}
      <AidFields
        parts={parts}
        values={values}
        errors={refusal ? { [refusal.field]: refusal.reason } : errors}
        units={units}
        onChange={change}
      />
      <View role="status">
        <Said worked={worked} />
      </View>
      {worked?.ok ? <Figures says={worked.says} /> : null}
      {units === 'in' ? (
        <SegmentedControl
          label="Inches as"
          options={[
            { value: 'fractions', label: 'fractions' },
            { value: 'decimals', label: 'decimals' },
          ]}
          value={decimals ? 'decimals' : 'fractions'}
          onChange={(choice) => setDecimals(choice === 'decimals')}
        />
      ) : null}
      {me ? (
        <SetUps
          aid={aid.id}
          units={units}
          values={values}
          said={worked?.ok ? worked.says.say : null}
          fromCard={screen.fromCard}
          onTake={change}
        />
      ) : null}
      <Rule />
      <Text size="note" tone="ink2">
        {`Source: ${aid.sources}`}
      </Text>
      <Link href="/aids">All bench aids</Link>
    </Stack>
  );
}

/** What to do, large; why not, when the aid refuses. */
function Said({ worked }: { worked: Worked | null }) {
  if (!worked) {
    return <Text tone="ink2">Fill in what is marked above; then the answer stands here.</Text>;
  }
  const { kind, say, why } = worked.ok
    ? worked.says
    : { kind: 'need' as const, say: worked.reason, why: worked.cure };
  return (
    <View style={styles.said}>
      <Row gap={12} align="flex-start">
        <View style={styles.shape}>
          <VerdictShape kind={kind} size={24} label={verdictLook[kind].word} />
        </View>
        <Stack gap={8} style={styles.words}>
          <Text size="heading" weight={700}>
            {say}
          </Text>
          {why ? <Text>{why}</Text> : null}
        </Stack>
      </Row>
    </View>
  );
}

function Figures({ says }: { says: AidSays }) {
  return (
    <View role="list" aria-label="Figures">
      {says.rows.map((row) => (
        <View key={row.label} role="listitem">
          <View style={styles.figure}>
            <View style={styles.label}>
              <Text>{row.label}</Text>
              {row.note ? (
                <Text size="note" tone="ink2">
                  {row.note}
                </Text>
              ) : null}
            </View>
            {typeof row.figure === 'string' ? (
              <Text mono weight={600} align="right">
                {row.figure}
              </Text>
            ) : (
              <Figure figure={row.figure} weight={600} />
            )}
          </View>
          <Rule />
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  said: {
    borderTopWidth: line.thick,
    borderBottomWidth: line.thin,
    borderColor: colour.ruleThick,
    paddingVertical: 16,
  },
  shape: { paddingTop: 4 },
  words: { flexShrink: 1, flexGrow: 1, alignSelf: 'auto' },
  figure: {
    flexDirection: 'row',
    justifyContent: 'space-between',
    alignItems: 'flex-start',
    gap: 16,
    paddingVertical: 8,
  },
  label: { flexShrink: 1 },
});
