import '@testing-library/jest-dom/vitest';
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { ErrorList } from '@/components/forms/error-list';
import { Field } from '@/components/forms/field';

afterEach(cleanup);

describe('a field', () => {
  it('reads out its hint and its error with its name, and keeps what was typed', () => {
    render(
      <Field label="Distance" name="hood.distance" hint="From the source" error="Must be above 0" defaultValue="-1" />,
    );
    const input = screen.getByRole('textbox', { name: 'Distance' });
    expect(input).toHaveAccessibleDescription('From the source Must be above 0');
    expect(input).toBeInvalid();
    expect(input).toHaveValue('-1');
    expect(input).toHaveAttribute('name', 'hood.distance');
  });

  it('is not described by what it has not got', () => {
    render(<Field label="Distance" name="distance" />);
    expect(screen.getByRole('textbox')).not.toHaveAttribute('aria-describedby');
    expect(screen.getByRole('textbox')).toBeValid();
  });
});

describe('the list of errors', () => {
  it('leads to each field that is wrong', () => {
    const errors = [{ path: 'hood.distance', message: 'Distance must be above 0' }];
    render(
      <>
        <ErrorList errors={errors} />
        <Field label="Distance" name="hood.distance" />
      </>,
    );
    const target = screen.getByRole('link', { name: 'Distance must be above 0' }).getAttribute('href');
    expect(screen.getByRole('textbox')).toHaveAttribute('id', target?.slice(1));
  });

  it('is not there when nothing is wrong', () => {
    const { container } = render(<ErrorList errors={[]} />);
    expect(container).toBeEmptyDOMElement();
  });
});
