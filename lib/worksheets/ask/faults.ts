import type { FieldFault } from '@/lib/outcome';
import { fieldAt, fieldsOf, type Ask } from './fields';

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

/** Faults as sentences for whoever typed, each beside the field of the form it is about. */
export function faultsForReader(ask: Ask, faults: readonly FieldFault[]): FieldFault[] {
  return faults.map(({ path, message }) => {
    const found = fieldAt(fieldsOf(ask), path);
    if (!found || !/^[a-z]/.test(message)) return { path, message };
    const choose = found.field.as === 'choice' && /^is missing/.test(message);
    return {
      path,
      message: choose ? 'Choose one.' : `${capital(found.field.label)} ${message}.`.replace(/\.\.$/, '.'),
    };
  });
}

/** The same for a list apart from the fields: each sentence says which row it is about. */
export function namedFaults(ask: Ask, faults: readonly FieldFault[]): FieldFault[] {
  return faults.map(({ path, message }) => {
    const found = fieldAt(fieldsOf(ask), path);
    if (!found) return { path, message };
    const about = [
      capital(found.rows),
      message.startsWith(capital(found.field.label)) ? '' : capital(found.field.label),
    ];
    return { path, message: [...about.filter(Boolean), message].join(': ') };
  });
}
