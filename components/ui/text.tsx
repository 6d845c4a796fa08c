import type { Ref } from 'react';
import { StyleSheet, Text as NativeText, type StyleProp, type TextProps as NativeTextProps, type TextStyle } from 'react-native';
import { family, type Weight } from '../theme/fonts';
import { colors, type, typeStyle, type ColorName, type TextVariant } from '../theme/tokens';

export interface TextProps extends Omit<NativeTextProps, 'style'> {
  readonly variant?: TextVariant;
  readonly color?: ColorName;
  /** Another weight than the variant's own. */
  readonly weight?: Weight;
  /** Makes it a heading of this level; a page has one of level 1. */
  readonly level?: 1 | 2 | 3 | 4;
  readonly style?: StyleProp<TextStyle>;
  readonly ref?: Ref<NativeText>;
}

/**
 * The only text of the product: React Native's own would fall back to the system font. Sizes that differ on wide windows come
 * from the style sheet (web-styles.ts) by `data-type`, so that the static page is right at once.
 */
export function Text({ variant = 'body', color = 'ink', weight, level, style, ...rest }: TextProps) {
  return (
    <NativeText
      {...(level ? { role: 'heading' as const, 'aria-level': level } : {})}
      {...rest}
      dataSet={{ type: variant, ...rest.dataSet }}
      style={[sizes[variant], weight && weights[weight], inks[color], variant === 'plate' && capitals.on, style]}
    />
  );
}

const each = <Key extends string | number, Style extends TextStyle>(keys: readonly Key[], style: (key: Key) => Style) =>
  StyleSheet.create(Object.fromEntries(keys.map((key) => [key, style(key)])) as Record<Key, Style>);

// As sheets, not inline: the page's style sheet must be able to outweigh them.
const sizes = each(Object.keys(type) as TextVariant[], (variant) => typeStyle(variant));
const weights = each([400, 500, 600, 700, 800] as const, (weight) => ({ fontFamily: family[weight] }));
const inks = each(Object.keys(colors) as ColorName[], (color) => ({ color: colors[color] }));
const capitals = StyleSheet.create({ on: { textTransform: 'uppercase' } });
