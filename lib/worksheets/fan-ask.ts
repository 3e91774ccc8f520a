import type { FieldAsk, RowsAsk } from './ask/fields';

export const curveAsk: RowsAsk = {
  ...{
    path: 'fan.curve',
    as: 'rows',
    label: 'points of the maker’s curve, from no airflow up',
    one: 'point',
    min: 2,
    max: 30,
  },
  fields: [
    { path: 'airflow', as: 'number', kind: 'airflow', label: 'airflow' },
    { path: 'staticPressure', as: 'number', kind: 'pressure', label: 'static pressure' },
  ],
};

export const speedAsk: FieldAsk = {
  ...{ path: 'fan.speed', as: 'number', label: 'measured speed, as a share of the curve’s' },
  help: '1 is full speed. The setting of a control is not a speed: measure it.',
};
