import type { Body, BodyShape } from '../../../shared/schemas/buildUp.ts';

type Kind = BodyShape['kind'];

/** Every shape with its dimensions, in the order they are asked for. */
export const dimensionsOf: Record<Kind, { name: string; text: string; first: number }[]> = {
  point: [],
  hoop: [{ name: 'radiusMm', text: 'Radius', first: 50 }],
  'solid cylinder, axial': [{ name: 'radiusMm', text: 'Radius', first: 50 }],
  'solid cylinder, transverse': [
    { name: 'radiusMm', text: 'Radius', first: 20 },
    { name: 'lengthMm', text: 'Length', first: 100 },
  ],
  'hollow cylinder, axial': [
    { name: 'outerRadiusMm', text: 'Outer radius', first: 50 },
    { name: 'innerRadiusMm', text: 'Inner radius', first: 40 },
  ],
  'hollow cylinder, transverse': [
    { name: 'outerRadiusMm', text: 'Outer radius', first: 50 },
    { name: 'innerRadiusMm', text: 'Inner radius', first: 40 },
    { name: 'lengthMm', text: 'Length', first: 100 },
  ],
  'rod, about its centre': [{ name: 'lengthMm', text: 'Length', first: 200 }],
  'rod, about its end': [{ name: 'lengthMm', text: 'Length', first: 200 }],
  block: [
    { name: 'widthMm', text: 'Width', first: 60 },
    { name: 'depthMm', text: 'Depth', first: 40 },
  ],
  'solid sphere': [{ name: 'radiusMm', text: 'Radius', first: 25 }],
  'thin sphere': [{ name: 'radiusMm', text: 'Radius', first: 25 }],
  'cone, axial': [{ name: 'radiusMm', text: 'Base radius', first: 40 }],
};

export const shapeKinds = Object.keys(dimensionsOf) as Kind[];

/** A shape of a kind with dimensions to start from. */
export function newShape(kind: Kind): BodyShape {
  const sizes = dimensionsOf[kind].map(({ name, first }) => [name, first]);
  return { kind, ...Object.fromEntries(sizes) } as BodyShape;
}

export function newBody(number: number): Body {
  return {
    name: `body ${number}`,
    shape: newShape('solid cylinder, axial'),
    mass: 1,
    count: 1,
    placement: 'fixed',
    offsetMm: 0,
  };
}

/** “solid cylinder, axial: radius 50 mm” */
export function shapeWords(shape: BodyShape): string {
  const sizes = dimensionsOf[shape.kind].map(
    ({ name, text }) => `${text.toLowerCase()} ${String(shape[name as keyof BodyShape])} mm`,
  );
  return sizes.length === 0 ? shape.kind : `${shape.kind}: ${sizes.join(', ')}`;
}
