import Svg, { Circle, Path, Rect } from 'react-native-svg';
import { colour } from './tokens';

/** The drawn box of a checkbox: off, on, or some of what is below it. */
export function CheckShape({ state, disabled }: { state: boolean | 'mixed'; disabled?: boolean }) {
  const ink = disabled ? colour.ruleThin : colour.blue;
  if (state === true) {
    return (
      <Svg width={24} height={24} viewBox="0 0 22 22" aria-hidden>
        <Rect x={1} y={1} width={20} height={20} fill={ink} />
        <Path d="M4.5 11.5 9.5 16 17.5 6" fill="none" stroke={colour.onBlue} strokeWidth={2.5} />
      </Svg>
    );
  }
  const edge = state === 'mixed' ? ink : disabled ? colour.ruleThin : colour.rule;
  return (
    <Svg width={24} height={24} viewBox="0 0 22 22" aria-hidden>
      <Rect
        x={1}
        y={1}
        width={20}
        height={20}
        fill={colour.sheet}
        stroke={edge}
        strokeWidth={1.5}
      />
      {state === 'mixed' ? <Path d="M5 11h12" stroke={ink} strokeWidth={2.5} /> : null}
    </Svg>
  );
}

/** The drawn ring of a radio. */
export function RadioShape({ on, disabled }: { on: boolean; disabled?: boolean }) {
  const ink = disabled ? colour.ruleThin : colour.blue;
  return (
    <Svg width={22} height={22} viewBox="0 0 20 20" aria-hidden>
      <Circle
        cx={10}
        cy={10}
        r={on ? 8 : 8.5}
        fill={colour.sheet}
        stroke={on ? ink : colour.rule}
        strokeWidth={on ? 2.5 : 1.5}
      />
      {on ? <Circle cx={10} cy={10} r={4} fill={ink} /> : null}
    </Svg>
  );
}

/** The drawn slide of a switch. */
export function SwitchShape({ on, disabled }: { on: boolean; disabled?: boolean }) {
  const knob = disabled ? colour.ruleThin : on ? colour.onBlue : colour.ink2;
  return (
    <Svg width={48} height={26} viewBox="0 0 48 26" aria-hidden>
      {on ? (
        <Rect x={0} y={0} width={48} height={26} fill={disabled ? colour.ink3 : colour.blue} />
      ) : (
        <Rect
          x={0.75}
          y={0.75}
          width={46.5}
          height={24.5}
          fill={colour.sheet}
          stroke={colour.rule}
          strokeWidth={1.5}
        />
      )}
      <Rect x={on ? 26 : 4} y={4} width={18} height={18} fill={knob} />
    </Svg>
  );
}
