import { describe, expect, it } from 'vitest';
import { capture } from '@/lib/entries/parts';
import { askHood } from '@/lib/worksheets/hood-airflow/ask';
import { airflowOfCapture, hoodWorksheetUrl, type CaptureNumbers } from '@/lib/worksheets/hood-airflow/from-capture';

const cabinet: CaptureNumbers = { hood: 'enclosure', velocity: { min: 0.51, max: 1.02 }, openArea: { value: 0.06 } };
const arm: CaptureNumbers = {
  ...{ hood: 'flanged-opening', velocity: { min: 0.51, max: 1.02 } },
  ...{ distance: { min: 0.2, max: 0.3 }, diameter: { value: 0.15 } },
};

describe('the airflow of a capture block', () => {
  it('is velocity times open area at both ends for an enclosure', () => {
    const airflow = airflowOfCapture(cabinet)!;
    expect(airflow.min).toBeCloseTo(0.0306, 12);
    expect(airflow.max).toBeCloseTo(0.0612, 12);
    expect(airflow.equation).toBe('Q = V A');
  });

  it('takes the near and slow end for the least and the far and fast end for the most', () => {
    const airflow = airflowOfCapture(arm)!;
    // By hand: A = 0.017671; 0.75 × 0.51 (0.4 + A) and 0.75 × 1.02 (0.9 + A).
    expect(airflow.min).toBeCloseTo(0.159759, 5);
    expect(airflow.max).toBeCloseTo(0.702019, 5);
  });

  it('is none where a number is missing or cannot be', () => {
    expect(airflowOfCapture({ ...cabinet, openArea: undefined })).toBeNull();
    expect(airflowOfCapture({ ...cabinet, openArea: { value: -1 } })).toBeNull();
    expect(airflowOfCapture({ hood: 'canopy', velocity: {} })).toBeNull();
  });
});

describe('the worksheet filled in from a capture block', () => {
  it('asks at the end that needs the most air, in SI and without naming units', () => {
    const url = hoodWorksheetUrl(arm);
    expect(url).toBe('/worksheets/hood-airflow?hood=flanged-opening&velocity=1.02&distance=0.3&diameter=0.15');
    const asked = askHood(new URLSearchParams(url.split('?')[1]));
    expect(asked.state === 'answered' && asked.answer.result.airflow).toBeCloseTo(airflowOfCapture(arm)!.max, 12);
  });

  it('takes the capture block of every entry as it is stored', () => {
    const stored = capture.parse({
      hood: 'enclosure',
      velocity: { min: '0.51', max: '1.02', unit: 'm/s', provenance: 'common practice' },
      openArea: { value: '0.06', unit: 'm2', provenance: 'common practice' },
    });
    expect(airflowOfCapture(stored)).toEqual(airflowOfCapture(cabinet));
    expect(hoodWorksheetUrl(stored)).toBe('/worksheets/hood-airflow?hood=enclosure&velocity=1.02&openArea=0.06');
  });
});
