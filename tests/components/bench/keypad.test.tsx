import { fireEvent, render, screen } from '@testing-library/react';
import { useState } from 'react';
import { keyed, Keypad } from '../../../components/bench/keypad';
import { parseLength } from '../../../shared/measure';

const press = (keys: string[]) => keys.reduce((text, key) => keyed(text, key), '');

describe('the keypad', () => {
  it.each([
    [['2', 'and', '3', '/4'], '2 3/4'],
    [['2', 'and', '3', '/4', '/8'], '2 3/8'],
    [['1', '1', '/16'], '11/16'],
    [['1', '7', '.', '6'], '17.6'],
    [['1', '.', '.', '5'], '1.5'],
    [['and', '/4', '5'], '5'],
    [['1', '2', 'erase'], '1'],
  ])('%j is %s', (keys, text) => {
    expect(press(keys)).toBe(text);
    expect(parseLength(text, { unit: 'in' }).ok).toBe(true);
  });

  it('puts a figure together by its named keys', () => {
    function Field() {
      const [text, setText] = useState('');
      return (
        <>
          <output>{text}</output>
          <Keypad unit="in" value={text} onChange={setText} />
        </>
      );
    }
    render(<Field />);
    for (const name of ['9', 'and', '1', 'over 4'])
      fireEvent.click(screen.getByRole('button', { name }));
    expect(screen.getByRole('status').textContent).toBe('9 1/4');
  });
});
