import { IconButton } from '../ui/icon-button';
import { SegmentedControl } from '../ui/radio-group';
import { useTheme, type ThemeChoice } from '../ui/theme';

const options: { value: ThemeChoice; label: string }[] = [
  { value: 'day', label: 'day' },
  { value: 'night', label: 'night' },
  { value: 'system', label: 'as the device' },
];

/** Day, night or as the device; kept on this device. */
export function ThemeSetting() {
  const { choice, choose } = useTheme();
  return <SegmentedControl label="Light" options={options} value={choice} onChange={choose} />;
}

/** The bar's moon or sun: turns the shown theme over. */
export function ThemeButton({ size = 'touch' }: { size?: 'touch' | 'bench' }) {
  const { shown, choose } = useTheme();
  const night = shown === 'night';
  return (
    <IconButton
      kind="bare"
      size={size}
      icon={night ? 'sun' : 'night'}
      label={night ? 'Day light' : 'Night light'}
      onPress={() => choose(night ? 'day' : 'night')}
    />
  );
}
