import type { InputHTMLAttributes, ReactNode } from 'react';
import { fieldId } from './field-id';

/** What ties an input to its label, hint and error. */
export type FieldControl = { id: string; name: string; 'aria-describedby'?: string; 'aria-invalid'?: true };

type Props = Omit<InputHTMLAttributes<HTMLInputElement>, 'children' | 'name' | 'id'> & {
  label: ReactNode;
  name: string;
  id?: string;
  hint?: ReactNode;
  error?: string;
  /** Draws another control than a plain input. */
  children?: (control: FieldControl) => ReactNode;
};

/** A labelled field. Its hint and its error are read out with it; what was typed stays. */
export function Field({ label, name, id = fieldId(name), hint, error, children, className = '', ...input }: Props) {
  const described = [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(' ') || undefined;
  const control: FieldControl = { id, name, 'aria-describedby': described, ...(error ? { 'aria-invalid': true } : {}) };
  return (
    <div className="space-y-1">
      <label htmlFor={id} className="block font-semibold">
        {label}
      </label>
      {hint && (
        <p id={`${id}-hint`} className="text-base text-quiet">
          {hint}
        </p>
      )}
      {children ? children(control) : <input {...control} {...input} className={`input ${className}`} />}
      {error && (
        <p id={`${id}-error`} className="text-base font-semibold text-kiln">
          {error}
        </p>
      )}
    </div>
  );
}
