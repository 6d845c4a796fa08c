import { createElement, type ReactNode } from 'react';
import { StyleSheet, type StyleProp, type ViewStyle } from 'react-native';

type Props = Readonly<Record<string, unknown>> & { readonly children?: ReactNode; readonly style?: StyleProp<ViewStyle> };

/** One SVG element of the browser under react-native-svg's name. Both use the same attribute names. */
const element = (tag: string) => {
  const Element = ({ style, testID: _testID, ...props }: Props) =>
    createElement(tag, style ? { ...props, style: StyleSheet.flatten(style) } : props);
  Element.displayName = tag;
  return Element;
};

/**
 * react-native-svg in the browser, as far as this product uses it. Metro resolves "react-native-svg" to this file on the web
 * (metro.config.js): the package brings an XML parser and a fetcher that no page needs, some 20 KB.
 */
export const Svg = element('svg');
export default Svg;
export const Circle = element('circle');
export const ClipPath = element('clipPath');
export const Defs = element('defs');
export const Ellipse = element('ellipse');
export const G = element('g');
export const Line = element('line');
export const LinearGradient = element('linearGradient');
export const Path = element('path');
export const Pattern = element('pattern');
export const Polygon = element('polygon');
export const Polyline = element('polyline');
export const Rect = element('rect');
export const Stop = element('stop');
export const Text = element('text');
export const TSpan = element('tspan');
