import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { asks } from '@/components/worksheets/asked/live-results';
import { askPage, exampleAddress } from '@/lib/worksheets/ask/ask-page';
import { faultsForReader, namedFaults } from '@/lib/worksheets/ask/faults';
import { fieldAt, fieldsOf, type Ask } from '@/lib/worksheets/ask/fields';
import { isExample } from '@/lib/worksheets/ask/is-example';
import { inUnits, requestFrom, typedOf } from '@/lib/worksheets/ask/request';
import { withoutRow, withRow } from '@/lib/worksheets/ask/rows';
import { isBlank, MAX_KEPT, paramsOf, typedFrom } from '@/lib/worksheets/ask/typed';
import { EXAMPLES } from '@/lib/worksheets/examples';
import { worksheetNamed } from '@/lib/worksheets/list';
import { libraryFacts } from '../library-facts';

const duct = asks['duct-pressure'];
const address = (text: string) => new URLSearchParams(text);
const typed = (text: string, ask: Ask = duct) => typedFrom(ask, address(text));

describe.each(Object.entries(asks))('the form of %s', (name, ask) => {
  it('writes its example into an address, and the address asks the example again', () => {
    const example = EXAMPLES[name]!;
    const read = requestFrom(ask, typedFrom(ask, address(exampleAddress(ask, example).split('?')[1]!)));
    expect(read.ok && read.value).toEqual(example);
  });

  it('answers its example on its page', () => {
    const asked = askPage(
      worksheetNamed(name)!,
      ask,
      address(exampleAddress(ask, EXAMPLES[name]!).split('?')[1]!),
      libraryFacts,
    );
    expect(asked.state).toBe('answered');
  });

  it('asks nothing that its schema does not know: every name it can write is admitted or missed, never unknown', () => {
    const worksheet = worksheetNamed(name)!;
    const all = paramsOf(typedOf(ask, EXAMPLES[name]!));
    const unknown = worksheet.run(
      { ...(requestFrom(ask, typedFrom(ask, all)) as { value: object }).value, nothing: 1 },
      libraryFacts,
    );
    expect(unknown).toMatchObject({ ok: false, status: 400, errors: [{ path: 'nothing' }] });
  });

  it('means the same in the other units', () => {
    const si = typedOf(ask, EXAMPLES[name]!);
    const back = requestFrom(ask, inUnits(ask, inUnits(ask, si, 'us'), 'si'));
    const flat = (value: unknown): unknown[] =>
      value && typeof value === 'object' ? Object.values(value).flatMap(flat) : [value];
    const [ours, theirs] = [flat(EXAMPLES[name]), flat(back.ok && back.value)];
    expect(theirs).toHaveLength(ours.length);
    ours.forEach((value, i) =>
      typeof value === 'number' && value !== 0
        ? expect(Number(theirs[i]) / value).toBeCloseTo(1, 3)
        : expect(theirs[i]).toEqual(value),
    );
  });
});

describe('an address', () => {
  it('is blank with nothing in it, and keeps what it does not know out', () => {
    expect(isBlank(typed(''))).toBe(true);
    expect(isBlank(typed('colour=red&units=us'))).toBe(true);
    expect(typed('airflow=200&colour=red').texts.size).toBe(1);
  });

  it('never throws and never grows past what a form can hold, whatever stands in it', () => {
    fc.assert(
      fc.property(fc.array(fc.tuple(fc.string(), fc.string()), { maxLength: 30 }), (pairs) => {
        const read = typedFrom(duct, new URLSearchParams(pairs));
        for (const all of read.texts.values())
          for (const text of all) expect(text.length).toBeLessThanOrEqual(MAX_KEPT);
        requestFrom(duct, read);
      }),
    );
    expect(
      typed(`runs.999999.diameter=1&runs.3.diameter=${'9'.repeat(500)}`).texts.get('runs.3.diameter')?.[0],
    ).toHaveLength(MAX_KEPT);
    expect(typed('runs.999999.diameter=1').texts.has('runs.999999.diameter')).toBe(false);
  });

  it('reads a bare number in the unit that stands beside it, and another where it is written', () => {
    const diameter = (text: string) => {
      const read = requestFrom(duct, typed(`runs.0.diameter=${text}`));
      return read.ok && (read.value as { runs: { diameter: number }[] }).runs[0]!.diameter;
    };
    expect(diameter('125')).toBeCloseTo(0.125, 12);
    expect(diameter('5 in')).toBeCloseTo(0.127, 12);
    expect(diameter('4&units=us')).toBeCloseTo(0.1016, 12);
  });

  it('says where no number stands', () => {
    const read = requestFrom(duct, typed('airflow=lots&runs.1.length=far'));
    expect(read).toMatchObject({ ok: false, errors: [{ path: 'airflow' }, { path: 'runs.1.length' }] });
  });
});

describe('rows', () => {
  const two = typed('runs.0.duct=smooth-plastic&runs.1.duct=galvanised-steel&runs.1.fittings.0.fitting=mitre-90');

  it('are added empty and at the end, within others too', () => {
    expect(withRow(duct, two, 'runs').texts.get('runs.2.duct')).toEqual(['']);
    expect(withRow(duct, two, 'runs.1.fittings').texts.has('runs.1.fittings.1.fitting')).toBe(true);
    expect(withRow(duct, two, 'no.such')).toBe(two);
  });

  it('are taken away with what is in them, and later ones move up', () => {
    const one = withoutRow(duct, two, 'runs.0');
    expect(one.texts.get('runs.0.duct')).toEqual(['galvanised-steel']);
    expect(one.texts.get('runs.0.fittings.0.fitting')).toEqual(['mitre-90']);
    expect(one.texts.has('runs.1.duct')).toBe(false);
    expect(withoutRow(duct, one, 'runs.0')).toBe(one);
  });

  it('come and go by a button without scripts, and nothing typed is lost', () => {
    const asked = askPage(worksheetNamed('duct-pressure')!, duct, address(`${paramsOf(two)}&add=runs`), libraryFacts);
    expect(asked.state).toBe('blank');
    expect(asked.typed.texts.get('runs.1.duct')).toEqual(['galvanised-steel']);
    expect(asked.typed.texts.has('runs.2.duct')).toBe(true);
  });
});

describe('a fault', () => {
  it('is a sentence beside its field, and says which row in a list', () => {
    const faults = [
      { path: 'runs.1.fittings.0.k', message: 'is missing: use the maker’s' },
      { path: 'runs.0.duct', message: 'is missing: one of' },
    ];
    expect(faultsForReader(duct, faults).map(({ message }) => message)).toEqual([
      'Loss factor C, if you know it is missing: use the maker’s.',
      'Choose one.',
    ]);
    expect(namedFaults(duct, faultsForReader(duct, faults))[1]!.message).toBe('Run 1: Kind of duct: Choose one.');
    expect(fieldAt(fieldsOf(duct), 'runs.1.fittings.0.k')?.rows).toBe('run 2, fitting 1');
    expect(fieldAt(fieldsOf(duct), 'runs.x.k')).toBeUndefined();
  });

  it('of a thing of several fields stands beside the first of them, within rows too', () => {
    expect(fieldAt(fieldsOf(duct), 'hood')?.path).toBe('hood.entryLossFactor');
    expect(fieldAt(fieldsOf(asks['room-balance']), 'exhausts.1.hood')).toMatchObject({
      path: 'exhausts.1.hood.entryLossFactor',
      rows: 'exhaust 2',
    });
    expect(faultsForReader(duct, [{ path: 'hood', message: 'is missing' }])).toEqual([
      { path: 'hood.entryLossFactor', message: 'Entry loss factor F of the hood is missing.' },
    ]);
  });

  it('of one tick stands beside them all', () => {
    const [fault] = faultsForReader(duct, [{ path: 'circumstances.3', message: 'must be one of: a, b' }]);
    expect(fault).toEqual({ path: 'circumstances', message: 'Something is ticked that this form does not have.' });
    expect(namedFaults(duct, [fault!])).toEqual([fault]);
  });
});

describe('a question with nothing filled in', () => {
  it('still has the parts that are always asked for, so that each is told what it lacks', () => {
    expect(requestFrom(asks['room-balance'], typed('', asks['room-balance']))).toMatchObject({
      value: { room: {}, air: {}, makeUp: {} },
    });
  });

  it('may leave a room without any way in for air: that is a question too', () => {
    const sealed = 'room.volume=60&air.indoor=20&air.outdoor=20&exhausts.0.name=fan&exhausts.0.airflow=100';
    const asked = askPage(worksheetNamed('room-balance')!, asks['room-balance'], address(sealed), libraryFacts);
    expect(JSON.stringify(asked)).not.toContain('is missing');
  });
});

describe('the invented example', () => {
  const example = (units: 'si' | 'us') => typedOf(duct, EXAMPLES['duct-pressure']!, units);

  it('is told from any other question, in whichever units, empty fields or not', () => {
    expect(isExample(duct, example('si'))).toBe(true);
    expect(isExample(duct, inUnits(duct, example('si'), 'us'))).toBe(true);
    expect(isExample(duct, typedFrom(duct, address(`${paramsOf(example('si'))}&runs.0.compression=`)))).toBe(true);
    expect(isExample(duct, typedFrom(duct, address(`${paramsOf(example('si'))}&carries=fume`)))).toBe(false);
    expect(isExample(duct, typed(''))).toBe(false);
    expect(isExample({ ...duct, name: 'of no example' }, example('si'))).toBe(false);
  });
});
