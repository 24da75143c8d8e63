import Svg, { Path } from 'react-native-svg';
import { colour } from './tokens';

/** The mark: a stick with its dyed end, a knife line through it and one mark to come. 16 grid, whole pixels. */
export function Mark({ size = 24 }: { size?: number }) {
  return (
    <Svg
      width={size}
      height={size}
      viewBox="0 0 16 16"
      aria-hidden
      style={{ shapeRendering: 'crispEdges' } as object}
    >
      <Path d="M0 4h9v8H0z" fill={colour.blue} />
      <Path d="M3 4h1v8H3z" fill={colour.film} />
      <Path d="M9 1h2v14H9zM11 4h5v8h-5v-1h4V5h-4zM13 8h1v3h-1z" fill={colour.ink} />
    </Svg>
  );
}
