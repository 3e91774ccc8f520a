import type { FieldFault } from '@/lib/outcome';
import { fieldAt, fieldsOf, type Ask, type FieldAsk } from './fields';

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);
const NO_SUCH_TICK = 'Something is ticked that this form does not have.';

function sentence(field: FieldAsk, message: string): string {
  if (!/^[a-z]/.test(message)) return message;
  if (field.as === 'checks') return NO_SUCH_TICK;
  if (field.as === 'choice' && /^is missing/.test(message)) return 'Choose one.';
  return `${capital(field.label)} ${message}.`.replace(/\.\.$/, '.');
}

/** Faults as sentences for whoever typed, each with the path of the field of the form that it is about. */
export function faultsForReader(ask: Ask, faults: readonly FieldFault[]): FieldFault[] {
  return faults.map(({ path, message }) => {
    const found = fieldAt(fieldsOf(ask), path);
    return found ? { path: found.path, message: sentence(found.field, message) } : { path, message };
  });
}

/** The same for a list apart from the fields: each sentence says which row it is about. */
export function namedFaults(ask: Ask, faults: readonly FieldFault[]): FieldFault[] {
  return faults.map(({ path, message }) => {
    const found = fieldAt(fieldsOf(ask), path);
    if (!found) return { path, message };
    const label = capital(found.field.label);
    const named = message.startsWith(label) || message === NO_SUCH_TICK;
    return { path, message: [capital(found.rows), named ? '' : label, message].filter(Boolean).join(': ') };
  });
}
