import { ClipPath, Defs, Path, Pattern, Rect } from 'react-native-svg';
import { colour } from '../ui/tokens';

/** Ids of one stick's hatchings and clip, unique on the page. */
export const stickIds = (id: string) => ({
  endGrain: `${id}e`,
  running: `${id}w`,
  clip: `${id}c`,
});
export type StickIds = ReturnType<typeof stickIds>;

interface StickDefsProps {
  ids: StickIds;
  /** The body's box, for clipping the stretches. */
  body: { x: number; y: number; width: number; height: number };
}

/** End grain at 45°, a line every 4; a running wait in blue, every 5. */
export function StickDefs({ ids, body }: StickDefsProps) {
  return (
    <Defs>
      <Pattern
        id={ids.endGrain}
        width={4}
        height={4}
        patternUnits="userSpaceOnUse"
        patternTransform="rotate(45)"
      >
        <Path d="M0 0V4" stroke={colour.ink} strokeWidth={1} />
      </Pattern>
      <Pattern
        id={ids.running}
        width={5}
        height={5}
        patternUnits="userSpaceOnUse"
        patternTransform="rotate(45)"
      >
        <Path d="M0 0V5" stroke={colour.blue} strokeWidth={1.2} />
      </Pattern>
      <ClipPath id={ids.clip}>
        <Rect {...body} />
      </ClipPath>
    </Defs>
  );
}
