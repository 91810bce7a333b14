// Drawings as elements of the page, under the names and with the props that the drawings and icons use.
import type { ElementType, SVGProps } from 'react';

type ShapeProps = SVGProps<SVGElement> & { testID?: string };

/** An element of the page under a name of the drawing; what only a phone knows is not written on it. */
const element = (Tag: ElementType) =>
  function Shape({ testID: _testID, ...props }: ShapeProps) {
    return <Tag {...props} />;
  };

export const Circle = element('circle');
export const ClipPath = element('clipPath');
export const Defs = element('defs');
export const Ellipse = element('ellipse');
export const G = element('g');
export const Line = element('line');
export const LinearGradient = element('linearGradient');
export const Mask = element('mask');
export const Path = element('path');
export const Pattern = element('pattern');
export const Polygon = element('polygon');
export const Polyline = element('polyline');
export const RadialGradient = element('radialGradient');
export const Rect = element('rect');
export const Stop = element('stop');
export const Svg = element('svg');
export const Text = element('text');
export const TSpan = element('tspan');
export const Use = element('use');

// Whatever is imported without a name is the whole drawing.
export default element('svg');
