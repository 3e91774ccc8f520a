import { Panel } from '@/components/ui/panel';
import type { PublishedEntry } from '@/lib/entries/library';
import type { Substance } from '@/lib/entries/schema';
import { Citations } from './citations';
import { ReviewLines } from './review-lines';
import { PlateLine, Stated } from './stated';

const WARNS = {
  yes: 'Smell warns',
  no: 'Smell does not warn',
  'not reliably': 'Smell does not warn reliably',
  unknown: 'Whether smell warns is not known',
};

function Odour({ it }: { it: Substance }) {
  if (!it.odour) return null;
  const { threshold, warns, text, sources, provenance } = it.odour;
  return (
    <PlateLine term="Smell">
      <strong className="block">{WARNS[warns]}</strong>
      {threshold && (
        <span className="block">
          Noticed at <Stated kind="concentration" of={threshold} unit={threshold.unit} sources={it.sources} />
        </span>
      )}
      {text}
      <Citations ids={sources} sources={it.sources} provenance={provenance} />
    </PlateLine>
  );
}

/** A substance's data plate: identity, cancer group, smell. */
export function SubstancePlate({ entry, it }: { entry: PublishedEntry; it: Substance }) {
  return (
    <Panel title="Data plate" look="plate">
      <dl>
        {it.cas && (
          <PlateLine term="CAS">
            <span className="figure">{it.cas}</span>
          </PlateLine>
        )}
        {it.formula && (
          <PlateLine term="Formula">
            <span className="figure">{it.formula}</span>
          </PlateLine>
        )}
        {it.molarMass && (
          <PlateLine term="Molar mass">
            <span className="figure">
              {it.molarMass} <span className="unit">g/mol</span>
            </span>
            <Citations ids={[it.molarMassSource]} sources={it.sources} />
          </PlateLine>
        )}
        {it.carcinogen && (
          <PlateLine term="Cancer">
            {it.carcinogen.body}{' '}
            {it.carcinogen.group === 'not evaluated' ? 'has not evaluated it' : `group ${it.carcinogen.group}`}
            <Citations
              ids={[it.carcinogen.source]}
              sources={it.sources}
              provenance={it.carcinogen.provenance}
              note={it.carcinogen.note}
            />
          </PlateLine>
        )}
        <Odour it={it} />
        <ReviewLines entry={entry} />
      </dl>
    </Panel>
  );
}
