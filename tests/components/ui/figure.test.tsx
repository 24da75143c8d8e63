import { render, screen } from '@testing-library/react';
import { displayLength } from '../../../shared/measure/display';
import { Rational } from '../../../shared/measure/rational';
import { Figure, parseFigure, speakFigure } from '../../../components/ui/figure';

describe('taking a plain figure apart', () => {
  test.each([
    ['2 3/4 in', { whole: '2', numerator: '3', denominator: '4', unit: 'in' }],
    ['23/32', { numerator: '23', denominator: '32' }],
    ['± 1/64 in', { sign: '±', numerator: '1', denominator: '64', unit: 'in' }],
    ['564.8 mm', { decimal: '564.8', unit: 'mm' }],
    ['-0.4 mm', { sign: '−', decimal: '0.4', unit: 'mm' }],
    ['12', { whole: '12' }],
    ['12:22', { decimal: '12:22' }],
    ['45°', { whole: '45', unit: '°' }],
    ['as made', { decimal: 'as made' }],
    ['', { decimal: '' }],
  ])('%s', (text, parts) => {
    expect(parseFigure(text)).toEqual(parts);
  });
});

describe('the spoken form', () => {
  // Sentences of the design reference's mock screens.
  test.each([
    ['2 3/4 in', 'two and three quarters inches'],
    ['9 1/4', 'nine and one quarter'],
    ['23/32', 'twenty-three thirty-seconds'],
    ['1 15/16 in', 'one and fifteen sixteenths inches'],
    ['564.8 mm', '564.8 millimetres'],
    ['-0.4 mm', 'minus 0.4 millimetres'],
    ['62 %', 'sixty-two per cent'],
    ['12 in', 'twelve inches'],
  ])('%s: %s', (text, said) => {
    expect(speakFigure(parseFigure(text))).toBe(said);
  });
  test('a fraction of a unit, one of a unit, an odd denominator', () => {
    expect(speakFigure(parseFigure('1/2 in'))).toBe('one half of an inch');
    expect(speakFigure(parseFigure('1 mm'))).toBe('one millimetre');
    expect(speakFigure(parseFigure('5/7 in'))).toBe('five over seven of an inch');
  });
  test('the engine’s own words win', () => {
    expect(speakFigure({ whole: 2, unit: 'in', spoken: 'two inches, as read' })).toBe(
      'two inches, as read',
    );
  });
});

test('the drawing is hidden from the screen reader, the words are not', () => {
  render(<Figure figure="2 3/4 in" />);
  const words = screen.getByText('two and three quarters inches');
  expect(words.closest('[aria-hidden="true"]')).toBeNull();
  expect(screen.getByText('in').closest('[aria-hidden="true"]')).not.toBeNull();
});

test('what the measure engine hands out is drawn and said as it is', () => {
  // 6 ft 2 3/4 in is 74.75 in of 25.4 mm exactly (ISO 31; the international inch).
  const mm = Rational.fromNumber(74.75 * 25.4);
  const wide = displayLength(mm, { system: 'in', instrument: 'tape', grid: 64, feet: true });
  const { container } = render(<Figure figure={wide} />);
  expect(screen.getByText(wide.spoken)).toBeTruthy();
  expect(container.querySelector('[aria-hidden="true"]')?.textContent).toBe('6 ft 2 3/4 in');
});

test('a minus is a minus sign, and the unit can stand in the column’s head', () => {
  const { container } = render(
    <Figure figure={{ sign: '-', decimal: '0.4', unit: 'mm' }} withoutUnit />,
  );
  const drawn = container.querySelector('[aria-hidden="true"]')?.textContent;
  expect(drawn).toBe('−0.4');
});
