import { useMe } from '../data/me-queries';
import { usePreferences } from '../data/preferences';
import { Heading } from '../ui/heading';
import { Section } from '../ui/layout';
import { SegmentedControl } from '../ui/radio-group';
import { Text } from '../ui/text';

/** Units and reach, switched where the work is, and what this device does not do. */
export function BenchWays({ awake }: { awake: boolean | null }) {
  const { me } = useMe();
  const [{ units, hand }, change] = usePreferences(me !== null);
  return (
    <Section>
      <Heading level={2} size="lead">
        At the bench
      </Heading>
      <SegmentedControl
        label="Figures in"
        options={[
          { value: 'mm', label: 'millimetres' },
          { value: 'in', label: 'inches' },
        ]}
        value={units}
        onChange={(next) => change({ units: next })}
      />
      <SegmentedControl
        label="In reach of"
        options={[
          { value: 'left', label: 'the left hand' },
          { value: 'right', label: 'the right hand' },
        ]}
        value={hand}
        onChange={(next) => change({ hand: next })}
      />
      {awake === false ? (
        <Text tone="ink2">
          This browser does not let the screen stay on; it may go dark. Set it longer in the phone’s
          own settings.
        </Text>
      ) : null}
      <Text tone="ink2" size="note">
        Page keys, arrows, space and foot pedals turn the steps. A wait rings while this page is
        open; with the screen off it may ring up to a minute late.
      </Text>
    </Section>
  );
}
