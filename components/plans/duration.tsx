import { Figure } from '../ui/figure';
import { Text } from '../ui/text';

/** Minutes as hours and minutes, in figures. */
export function Duration({ minutes }: { minutes: number }) {
  const whole = Math.round(minutes);
  const h = Math.floor(whole / 60);
  const min = whole % 60;
  return (
    <Text weight={600}>
      {h > 0 ? <Figure figure={{ whole: h, unit: 'h' }} /> : null}
      {h > 0 && min > 0 ? ' ' : null}
      {min > 0 || h === 0 ? <Figure figure={{ whole: min, unit: 'min' }} /> : null}
    </Text>
  );
}
