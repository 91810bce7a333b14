import type { ReactNode } from 'react';
import { Text as NativeText, type StyleProp, type TextStyle } from 'react-native';
import { face, toneColor, typeScale, type TextKind, type Tone } from '@/components/theme';

export interface TextProps {
  children?: ReactNode;
  kind?: TextKind;
  tone?: Tone;
  strong?: boolean;
  italic?: boolean;
  mono?: boolean;
  struck?: boolean;
  align?: 'left' | 'center' | 'right';
  /** Makes it a heading of this level. */
  heading?: 1 | 2 | 3 | 4;
  role?: 'status' | 'alert' | 'paragraph';
  id?: string;
  lines?: number;
  style?: StyleProp<TextStyle>;
  testID?: string;
}

/** Words in one of the kinds of the type scale. */
export function Text({ kind = 'body', tone = 'ink', heading, lines, style, children, ...rest }: TextProps) {
  const { strong, italic, mono, struck, align, role, id, testID } = rest;
  return (
    <NativeText
      id={id}
      testID={testID}
      numberOfLines={lines}
      role={heading ? 'heading' : (role as 'status' | 'alert' | undefined)}
      aria-level={heading}
      style={[
        typeScale[kind],
        { color: toneColor[tone], fontFamily: mono ? face.mono : face.text },
        strong ? { fontWeight: mono ? '700' : '600' } : null,
        italic ? { fontStyle: 'italic' } : null,
        struck ? { textDecorationLine: 'line-through' } : null,
        align ? { textAlign: align } : null,
        style,
      ]}
    >
      {children}
    </NativeText>
  );
}
