'use client';

import type { ReactNode } from 'react';
import { Combobox } from '@/components/forms/combobox';
import { Field } from '@/components/forms/field';

type Props = {
  name: string;
  id?: string;
  label: ReactNode;
  hint?: string;
  value: string;
  kind: 'material' | 'process';
  error?: string;
};

const LISTS = { material: 'Materials', process: 'Processes' };

/** A field for the name of a material or process, with suggestions from the library. */
export function NameField({ name, id, label, hint, value, kind, error }: Props) {
  return (
    <Field name={name} id={id} label={label} hint={hint} error={error}>
      {(control) => (
        <Combobox
          {...control}
          defaultValue={value}
          maxLength={80}
          required
          listLabel={LISTS[kind]}
          from={`/api/search?kind=${kind}&limit=8`}
        />
      )}
    </Field>
  );
}
