import { View } from 'react-native';
import Svg, { Path, Rect } from 'react-native-svg';
import { type DisplayPreference } from '../../../shared/measure';
import { displayMm } from '../../../shared/measure';
import { type DimensionState } from '../../../shared/plan/model';
import { Figure } from '../../ui/figure';
import { Row, Stack } from '../../ui/layout';
import { Text } from '../../ui/text';
import { colour, line } from '../../ui/tokens';

/** From the least to the most it can come out, the nominal marked between. */
export function BandDrawing({
  state,
  preference,
}: {
  state: DimensionState;
  preference: DisplayPreference;
}) {
  const { value, kind } = state;
  if (!value || kind !== 'length' || value.worst < 1e-9) return null;
  const fine = { ...preference, instrument: 'calipers' as const };
  const left = 40;
  const right = 260;
  const x = left + ((value.x - value.low) / (value.high - value.low)) * (right - left);
  return (
    <Stack gap={4}>
      <View aria-hidden>
        <Svg viewBox="0 0 300 34" width="100%" height={34}>
          <Rect x={left} y={6} width={right - left} height={22} fill={colour.holdsWash} />
          <Path d="M4 17H296" stroke={colour.ink} strokeWidth={line.thin} />
          <Path d={`M${left} 4V30M${right} 4V30`} stroke={colour.ink} strokeWidth={2.5} />
          <Path d={`M${x} 8V26`} stroke={colour.ink} strokeWidth={line.medium} />
        </Svg>
      </View>
      <Row justify="space-between" gap={8}>
        <Text size="small" tone="ink2">
          least <Figure figure={displayMm(value.low, fine)} />
        </Text>
        <Text size="small" tone="ink2">
          most <Figure figure={displayMm(value.high, fine)} />
        </Text>
      </Row>
    </Stack>
  );
}
