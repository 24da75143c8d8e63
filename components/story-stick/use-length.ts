import { useState } from 'react';
import { type LayoutChangeEvent } from 'react-native';

/** The measured width or height of a box in whole px; `given` skips measuring. 0 until known. */
export function useLength(axis: 'width' | 'height', given?: number) {
  const [measured, setMeasured] = useState(0);
  const onLayout = (event: LayoutChangeEvent) =>
    setMeasured(Math.floor(event.nativeEvent.layout[axis]));
  return { length: given ?? measured, onLayout: given === undefined ? onLayout : undefined };
}
