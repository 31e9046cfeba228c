import type { FieldErrors, UseFormRegister } from 'react-hook-form';
import type { Body, BodyShape, BuildUpInput } from '../../../shared/schemas/buildUp.ts';
import { SelectField } from '../../ui/SelectField.tsx';
import { TextField } from '../../ui/TextField.tsx';
import { dimensionsOf, newShape, shapeKinds } from './shapes.ts';

type BodyFieldsProps = {
  index: number;
  register: UseFormRegister<BuildUpInput>;
  shape: BodyShape;
  setShape: (shape: BodyShape) => void;
  errors: FieldErrors<Body> | undefined;
};

const placements = [
  { value: 'fixed', text: 'fixed, off the axis by' },
  { value: 'slide', text: 'rides on the slide, plus' },
];

/** The controls of one body. */
export function BodyFields({ index, register, shape, setShape, errors }: BodyFieldsProps) {
  const sizes = errors?.shape as Record<string, { message?: string }> | undefined;
  return (
    <div className="grid gap-3 sm:grid-cols-2 lg:grid-cols-4">
      <TextField label="Name" error={errors?.name?.message} {...register(`bodies.${index}.name`)} />
      <SelectField
        label="Shape"
        options={shapeKinds}
        value={shape.kind}
        onChange={(event) => setShape(newShape(event.target.value as BodyShape['kind']))}
      />
      {dimensionsOf[shape.kind].map(({ name, text }) => (
        <TextField
          key={`${shape.kind} ${name}`}
          label={text}
          unit="mm"
          inputMode="decimal"
          error={sizes?.[name]?.message}
          {...register(`bodies.${index}.shape.${name}` as `bodies.${number}.shape.radiusMm`, {
            valueAsNumber: true,
          })}
        />
      ))}
      <TextField
        label="Mass, each"
        unit="kg"
        inputMode="decimal"
        error={errors?.mass?.message}
        {...register(`bodies.${index}.mass`, { valueAsNumber: true })}
      />
      <TextField
        label="Count"
        inputMode="numeric"
        error={errors?.count?.message}
        {...register(`bodies.${index}.count`, { valueAsNumber: true })}
      />
      <SelectField label="Place" options={placements} {...register(`bodies.${index}.placement`)} />
      <TextField
        label="Offset"
        unit="mm"
        inputMode="decimal"
        error={errors?.offsetMm?.message}
        {...register(`bodies.${index}.offsetMm`, { valueAsNumber: true })}
      />
    </div>
  );
}
