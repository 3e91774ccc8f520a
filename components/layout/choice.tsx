import type { ReactNode } from 'react';

type Props = { name: string; legend: string; options: { value: string; label: string; shown: ReactNode }[] };

/** A few choices side by side, the first one ticked. Styles read the ticks; settle.js remembers them. */
export function Choice({ name, legend, options }: Props) {
  return (
    <fieldset className="choice">
      <legend className="sr-only">{legend}</legend>
      {options.map(({ value, label, shown }, i) => (
        <label key={value} title={label} className="relative">
          <input
            type="radio"
            id={`${name}-${value}`}
            name={`show-${name}`}
            value={value}
            defaultChecked={i === 0}
            autoComplete="off"
            className="absolute inset-0 cursor-pointer opacity-0"
          />
          <span aria-hidden="true">{shown}</span>
          <span className="sr-only">{label}</span>
        </label>
      ))}
    </fieldset>
  );
}
