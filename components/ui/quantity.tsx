import { show, showRange, type ShownKind } from '@/lib/units/show';
import { SYSTEMS, type System } from '@/lib/units/kinds';

type Props = {
  kind: ShownKind;
  /** In the kind's stored unit; the middle figure when `min` and `max` are given. */
  value?: number;
  min?: number;
  max?: number;
  /** The unit of a concentration. */
  unit?: string;
};

function shownIn(system: System, { kind, value, min, max, unit }: Props) {
  if (min !== undefined && max !== undefined) return showRange(kind, min, max, system, unit);
  const single = value ?? min ?? max;
  const shown = single === undefined ? { text: '—', unit: '' } : show(kind, single, system, unit);
  const bound = value !== undefined ? '' : min !== undefined ? '≥ ' : max !== undefined ? '≤ ' : '';
  return { ...shown, text: bound + shown.text };
}

/** A quantity in both systems; the reader's choice, marked on the page, shows one of them. */
export function Quantity(props: Props) {
  const systems = props.kind === 'concentration' ? (['si'] as const) : SYSTEMS;
  return systems.map((system) => {
    const { text, unit } = shownIn(system, props);
    return (
      <span key={system} className={props.kind === 'concentration' ? 'figure' : `figure ${system}`}>
        {text}
        {unit && (
          <span className="unit">
            {'\u2009'}
            {unit}
          </span>
        )}
      </span>
    );
  });
}
