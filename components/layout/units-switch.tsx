import { Choice } from './choice';

const UNITS = [
  { value: 'si', label: 'SI units', shown: 'SI' },
  { value: 'us', label: 'US customary units', shown: 'US' },
];

export function UnitsSwitch() {
  return <Choice name="units" legend="Units" options={UNITS} />;
}
