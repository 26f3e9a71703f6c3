import { render, screen } from '@testing-library/react';
import { AirColumn } from './air-column';

const CLEAR_NIGHT = [
  { heightM: 2, temperatureC: -9.5 },
  { heightM: 10, temperatureC: -7.7 },
  { heightM: 30, temperatureC: -5.6 },
  { heightM: 60, temperatureC: -4.4 },
];

const drawing = () => screen.getByRole('img');

describe('the air column', () => {
  it('tells each level and that the lid is above when it is open at the top', () => {
    render(<AirColumn size="medium" levels={CLEAR_NIGHT} lid={{ topM: 60, open: 'at the top' }} />);
    expect(drawing()).toHaveAccessibleName(
      'Air column: −9.5 °C at 2 m, −7.7 °C at 10 m, −5.6 °C at 30 m, −4.4 °C at 60 m. ' +
        'It grows warmer up to the highest sensor at 60 m: open at the top, the lid is above.',
    );
    expect(drawing().querySelector('[stroke-dasharray="5 3"]')).not.toBeNull();
  });

  it('draws a closed lid as an unbroken line', () => {
    render(<AirColumn size="small" levels={CLEAR_NIGHT} lid={{ topM: 30, open: 'no' }} />);
    expect(drawing().querySelector('[stroke-dasharray]')).toBeNull();
    expect(drawing()).toHaveAccessibleName(/Colder air lies below 30 m, the lid/);
  });

  it.each(['small', 'medium', 'full'] as const)('is an empty dashed frame when not known, %s', (size) => {
    render(<AirColumn size={size} levels={CLEAR_NIGHT} lid={null} known={false} />);
    expect(drawing()).toHaveAccessibleName('Air column: not known.');
    expect(drawing().querySelectorAll('circle, polyline')).toHaveLength(0);
    expect(drawing().querySelector('rect')).toHaveAttribute('stroke-dasharray', '3 3');
  });

  it('is not known when no level has a value', () => {
    render(<AirColumn size="small" levels={[{ heightM: 2, temperatureC: null }]} lid={null} />);
    expect(drawing()).toHaveAccessibleName('Air column: not known.');
  });

  it('does not join across a missing level, and names it', () => {
    const gap = CLEAR_NIGHT.map((level) => (level.heightM === 10 ? { ...level, temperatureC: null } : level));
    render(<AirColumn size="medium" levels={gap} lid={null} />);
    expect(drawing().querySelectorAll('polyline')).toHaveLength(2);
    expect(drawing()).toHaveAccessibleName(/Not known at 10 m/);
  });
});
