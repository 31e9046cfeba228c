import { useId, useState } from 'react';

type SegmentsProps<Value extends string> = {
  label: string;
  value: Value;
  options: readonly { value: Value; text: string }[];
  onChange: (value: Value) => void;
};

/** One of a few, side by side: a radio group that looks like a switch. */
export function Segments<Value extends string>({
  label,
  value,
  options,
  onChange,
}: SegmentsProps<Value>) {
  const name = useId();
  // a choice that lives in the URL comes back a moment later; until then it is shown as made
  const [shown, setShown] = useState(value);
  const [seen, setSeen] = useState(value);
  if (seen !== value) {
    setSeen(value);
    setShown(value);
  }
  return (
    <fieldset className="inline-flex overflow-hidden rounded-md border border-control print:hidden">
      <legend className="sr-only">{label}</legend>
      {options.map((option) => (
        <label
          key={option.value}
          className="relative cursor-pointer border-l border-control px-2.5 py-1 text-sm first-of-type:border-l-0 hover:bg-hover has-checked:bg-chosen has-checked:font-bold has-checked:text-accent has-focus-visible:outline-2 has-focus-visible:-outline-offset-2 has-focus-visible:outline-accent"
        >
          <input
            type="radio"
            name={name}
            value={option.value}
            checked={option.value === shown}
            onChange={() => {
              setShown(option.value);
              onChange(option.value);
            }}
            className="absolute inset-0 cursor-pointer opacity-0"
          />
          {option.text}
        </label>
      ))}
    </fieldset>
  );
}
