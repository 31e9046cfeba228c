import { inertiaPolynomial } from '../../../shared/physics/inertiaPolynomial.ts';
import { bodySchema, type Body, type BuildUp } from '../../../shared/schemas/buildUp.ts';
import { InertiaView } from './InertiaView.tsx';

/** I(x) of the bodies as they are typed; silent while a field is still half-written. */
export function InertiaPreview({ bodies, slide }: { bodies: Body[]; slide: BuildUp['slide'] }) {
  const valid = bodies.length > 0 && bodies.every((body) => bodySchema.safeParse(body).success);
  if (!valid || !(slide.minMm < slide.maxMm)) {
    return <p className="text-sm text-muted">The inertia follows once every body is complete.</p>;
  }
  return <InertiaView polynomial={inertiaPolynomial(bodies)} slide={slide} marks={[]} />;
}
