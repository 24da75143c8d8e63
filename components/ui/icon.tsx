import Svg, { Path } from 'react-native-svg';
import { iconPaths, type IconName } from './icons.data';
import { colour, line, type ColourRole } from './tokens';

export { type IconName } from './icons.data';

export interface IconProps {
  name: IconName;
  /** Side in px; 20–24 in text and controls. */
  size?: number;
  tone?: ColourRole;
  /** 1.5, or 2.5 in the big bench buttons. */
  weight?: number;
}

/** One of the 62 drawn icons. Decoration only: the words beside it, or the control's label, name it. */
export function Icon({ name, size = 24, tone = 'ink', weight = line.medium }: IconProps) {
  return (
    <Svg width={size} height={size} viewBox="0 0 24 24" aria-hidden>
      <Path
        d={iconPaths[name]}
        fill="none"
        stroke={colour[tone]}
        strokeWidth={weight}
        strokeLinejoin="miter"
        strokeLinecap="butt"
      />
    </Svg>
  );
}
