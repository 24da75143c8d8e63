import { StyleSheet } from 'react-native';
import { Rational } from '../../shared/measure';
import { type Step } from '../../shared/plan/document';
import { displayMm } from '../../shared/measure';
import { type PlanValues } from '../plans/plan-model';
import { Figure } from '../ui/figure';
import { Icon } from '../ui/icon';
import { Row } from '../ui/layout';
import { Text } from '../ui/text';
import { colour, line } from '../ui/tokens';

/** Half a hundredth of a millimetre: closer figures are the same figure. */
const same = 0.005;

/** Where the maker's words and this builder's figures differ, said for as long as the clip shows. */
export function ClipSays({ step, values }: { step: Step; values: PlanValues }) {
  const differing = step.heard.flatMap((heard) => {
    if (heard.ruling !== 'say' || !heard.value || !heard.dimensionId) return [];
    const state = values.model.dimensions.get(heard.dimensionId);
    const said = Rational.parse(heard.value.mm);
    if (!state?.value || !said || Math.abs(said.toNumber() - state.value.x) <= same) return [];
    const yours = values.figure(heard.dimensionId);
    return yours
      ? [
          {
            id: heard.id,
            name: state.dimension.name,
            said: displayMm(said, { ...values.preference, grid: 64, instrument: 'rule' }),
            yours,
          },
        ]
      : [];
  });
  return differing.map((d) => (
    <Row key={d.id} gap={12} align="center" style={styles.box}>
      <Icon name="captions" size={26} />
      <Text size="lead" style={{ flex: 1 }}>
        The clip says <Figure figure={d.said} />. Yours is <Figure figure={d.yours} weight={700} />.
        <Text size="note" tone="ink2">
          {' '}
          {d.name}
        </Text>
      </Text>
    </Row>
  ));
}

const styles = StyleSheet.create({
  box: {
    borderWidth: line.medium,
    borderColor: colour.ink,
    backgroundColor: colour.sheet,
    padding: 12,
  },
});
