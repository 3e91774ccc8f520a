import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { CONTROL_WORDS } from '@/components/ui/control-words';
import { ControlLine } from '@/components/ui/control-line';
import { Glyph } from '@/components/ui/glyph';
import { halfChord } from '@/components/ui/glyph-paths';
import { CONTROLS, type ControlAnswer } from '@/lib/entries/vocabulary';

const ALL: ControlAnswer[] = [...CONTROLS, 'unknown'];

afterEach(cleanup);

/** Length of all strokes inside the section, in field units; a dot counts as its width. */
function inked(control: ControlAnswer) {
  const { container } = render(<Glyph control={control} />);
  const path = container.querySelector('path')?.getAttribute('d') ?? '';
  const lines = [...path.matchAll(/M(\S+) (\S+)L(\S+) (\S+?)(?=M|$)/g)].map((match) => match.slice(1).map(Number));
  return lines.reduce((sum, [x1 = 0, y1 = 0, x2 = 0, y2 = 0]) => sum + Math.hypot(x2 - x1, y2 - y1), 0);
}

describe('the glyph', () => {
  it('looks different for each of the five answers', () => {
    const drawings = ALL.map((control) => render(<Glyph control={control} />).container.innerHTML);
    const shapes = drawings.map((html) => html.replace(/data-control="[^"]*"/, ''));
    expect(new Set(shapes).size).toBe(5);
  });

  it('is denser the tighter the air must be held', () => {
    expect(inked('local exhaust')).toBeGreaterThan(50);
    expect(inked('enclosed exhaust')).toBeGreaterThan(2 * inked('local exhaust'));
  });

  it('is solid for prohibited and has only a broken outline for unknown', () => {
    const prohibited = render(<Glyph control="prohibited" />).container;
    expect(prohibited.querySelector('path')?.getAttribute('fill')).toBe('currentColor');
    const unknown = render(<Glyph control="unknown" />).container;
    expect(unknown.querySelector('path')).toBeNull();
    expect(unknown.querySelector('rect')?.getAttribute('stroke-dasharray')).toBeTruthy();
  });

  it('says nothing by itself and carries no id that another could take', () => {
    const { container } = render(ALL.map((control) => <Glyph key={control} control={control} />));
    expect(container.querySelectorAll('svg[aria-hidden="true"]')).toHaveLength(5);
    expect(container.querySelectorAll('[id]')).toHaveLength(0);
  });

  it('keeps its lines inside the section', () => {
    // A square of half-side 12 without rounding has the half diagonal 12√2; a circle of radius 12 has chords of 2√(144 − v²).
    expect(halfChord(0, 12, 0)).toBeCloseTo(12 * Math.SQRT2, 10);
    expect(halfChord(5, 12, 12)).toBeCloseTo(Math.sqrt(144 - 25), 10);
    expect(halfChord(17)).toBe(0);
  });
});

describe('the control line', () => {
  it.each(ALL)('says %s in words', (control) => {
    render(<ControlLine control={control} reason="A reason." />);
    expect(screen.getByText(CONTROL_WORDS[control])).toBeTruthy();
    expect(screen.getByText('A reason.')).toBeTruthy();
  });

  it('says not to run what is not identified', () => {
    render(<ControlLine control="unknown" />);
    expect(screen.getByText('Not identified: do not run it')).toBeTruthy();
    expect(screen.getByText(/treat it as prohibited/)).toBeTruthy();
  });

  it('marks an inference as one', () => {
    render(<ControlLine control="local exhaust" basis="inferred" />);
    expect(screen.getByText(/inferred from composition, not reviewed/)).toBeTruthy();
  });
});
