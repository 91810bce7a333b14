import type { ReactNode } from 'react';
import { View, type StyleProp, type ViewStyle } from 'react-native';

export interface StackProps {
  children?: ReactNode;
  /** Pixels between the children. */
  gap?: number;
  style?: StyleProp<ViewStyle>;
}

export interface RowProps extends StackProps {
  wrap?: boolean;
  align?: 'start' | 'center' | 'end' | 'baseline' | 'stretch';
  justify?: 'start' | 'between' | 'end' | 'center';
}

const alignment = {
  start: 'flex-start',
  center: 'center',
  end: 'flex-end',
  baseline: 'baseline',
  stretch: 'stretch',
} as const;
const justification = {
  start: 'flex-start',
  between: 'space-between',
  end: 'flex-end',
  center: 'center',
} as const;

/** Children below one another. */
export function Stack({ children, gap = 12, style }: StackProps) {
  return <View style={[{ gap, minWidth: 0 }, style]}>{children}</View>;
}

/** Children beside one another. */
export function Row({ children, gap = 8, wrap, align = 'center', justify = 'start', style }: RowProps) {
  return (
    <View
      style={[
        {
          flexDirection: 'row',
          gap,
          minWidth: 0,
          flexWrap: wrap ? 'wrap' : 'nowrap',
          alignItems: alignment[align],
          justifyContent: justification[justify],
        },
        style,
      ]}
    >
      {children}
    </View>
  );
}
