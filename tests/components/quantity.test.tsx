import { cleanup, render } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { Quantity } from '@/components/ui/quantity';

afterEach(cleanup);

function both(element: React.ReactElement) {
  const { container } = render(element);
  const text = (selector: string) => container.querySelector(selector)?.textContent?.replace(/\u2009/g, ' ');
  return [text('.si'), text('.us')];
}

describe('a quantity', () => {
  // 1 ft = 0.3048 m exactly: 0.508 m/s is 100 ft/min, 1 m³/s is 2118.88 ft³/min; 0 °C is 32 °F.
  it.each([
    [<Quantity key="a" kind="velocity" value={0.508} />, '0.508 m/s', '100 fpm'],
    [<Quantity key="b" kind="airflow" value={1} />, '3600 m³/h', '2120 cfm'],
    [<Quantity key="c" kind="length" value={0.1524} />, '152 mm', '6 in'],
    [<Quantity key="d" kind="temperature" value={0} />, '0 °C', '32 °F'],
  ])('is printed in both systems: case %#', (element, si, us) => {
    expect(both(element)).toEqual([si, us]);
  });

  it('is a range when it has two ends', () => {
    expect(both(<Quantity kind="velocity" min={0.508} max={1.016} />)).toEqual(['0.508–1.02 m/s', '100–200 fpm']);
  });

  it('says which bound it is when it has only one end', () => {
    expect(both(<Quantity kind="temperature" max={100} />)).toEqual(['≤ 100 °C', '≤ 212 °F']);
  });

  it('shows a dash when there is nothing to show', () => {
    expect(both(<Quantity kind="area" />)).toEqual(['—', '—']);
  });

  it('prints a concentration once, whatever the system', () => {
    const { container } = render(<Quantity kind="concentration" value={0.75} unit="ppm" />);
    expect(container.textContent?.replace(/\u2009/g, ' ')).toBe('0.75 ppm');
    expect(container.querySelector('.si, .us')).toBeNull();
  });

  it('sets the unit apart, with a thin space', () => {
    const { container } = render(<Quantity kind="pressure" value={250} />);
    expect(container.querySelector('.si .unit')?.textContent).toBe('\u2009Pa');
  });
});
