import { useState } from 'react';
import type { ReactNode } from 'react';
import { View } from 'react-native';
import type { LayoutChangeEvent } from 'react-native';

const WIDTH_BEFORE_MEASURED_PX = 320;
const LEAST_WIDTH_PX = 200;

export interface ChartFrameProps {
  name: string;
  /** What the drawing shows, in one sentence. */
  sentence: string;
  /** Draws at the width the frame was given. */
  children: (width: number) => ReactNode;
  /** Lies over the drawing at the same width: what can be pressed and focused, which an image cannot hold. */
  overlay?: (width: number) => ReactNode;
}

/** One drawing: measures its own width; readers hear its name and its sentence instead of its strokes. */
export function ChartFrame({ name, sentence, children, overlay }: ChartFrameProps) {
  const [width, setWidth] = useState(WIDTH_BEFORE_MEASURED_PX);
  const onLayout = (event: LayoutChangeEvent) => {
    const measured = Math.max(LEAST_WIDTH_PX, Math.floor(event.nativeEvent.layout.width));
    setWidth(measured);
  };
  return (
    <View onLayout={onLayout} style={{ minWidth: 0, width: '100%' }}>
      <View role="img" aria-label={`${name}. ${sentence}`} style={{ overflow: 'hidden' }}>
        {children(width)}
      </View>
      {overlay?.(width)}
    </View>
  );
}
