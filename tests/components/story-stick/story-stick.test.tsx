import { fireEvent, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { type StickInput, type StickStep } from '../../../shared/plan/stick/types';
import { BenchStick } from '../../../components/story-stick/bench-stick';
import { PlanStick } from '../../../components/story-stick/plan-stick';
import { StoryStick } from '../../../components/story-stick/story-stick';
import { withMark } from '../../../components/story-stick/use-stick-pointer';

const step = (
  number: number,
  start: number,
  end: number,
  more: Partial<StickStep> = {},
): StickStep => ({
  id: `s${number}`,
  number,
  title: `Title ${number}`,
  start,
  end,
  state: number < 3 ? 'done' : number === 3 ? 'current' : 'open',
  verdicts: [],
  waits: [],
  talk: [],
  ...more,
});
const input: StickInput = {
  duration: 100,
  steps: [0, 20, 40, 60, 80].map((t, i) => step(i + 1, t, t + 20)),
};

/** A stick 118 px wide: 2 before it, a body of 108 with a zero end of 8, 8 after it. One px is one second. */
const width = 118;

function Walking({ onOpen }: { onOpen?: (id: string) => void }) {
  const [at, setAt] = useState('s3');
  return (
    <StoryStick
      input={input}
      label="Story stick"
      width={width}
      selected={at}
      onStep={setAt}
      onOpen={onOpen}
    />
  );
}
const slider = () => screen.getByRole('slider');
const now = () => slider().getAttribute('aria-valuenow');

describe('keyboard', () => {
  test.each([
    ['{ArrowRight}', '4'],
    ['{ArrowLeft}', '2'],
    ['{ArrowDown}', '4'],
    ['{ArrowUp}', '2'],
    ['{Home}', '1'],
    ['{End}', '5'],
    ['{PageUp}', '1'],
    ['{PageDown}', '5'],
    ['{End}{ArrowRight}', '5'],
  ])('%s from step 3 leads to step %s', async (keys, expected) => {
    render(<Walking />);
    await userEvent.tab();
    await userEvent.keyboard(keys);
    expect(now()).toBe(expected);
  });

  test('one tab stop that says where it is; Enter opens', async () => {
    const open = jest.fn();
    render(<Walking onOpen={open} />);
    await userEvent.tab();
    expect(document.activeElement).toBe(slider());
    expect(slider().getAttribute('aria-valuetext')).toBe('Step 3 of 5, Title 3, 40 seconds');
    await userEvent.keyboard('{Enter}');
    expect(open).toHaveBeenCalledWith('s3');
    await userEvent.tab();
    expect(document.activeElement).toBe(document.body);
  });
});

test('without callbacks it is a picture with words', () => {
  render(<StoryStick input={input} label="Story stick" width={width} />);
  expect(screen.queryByRole('slider')).toBeNull();
  expect(
    screen.getByRole('img', { name: 'Story stick. Step 3 of 5, Title 3, 40 seconds' }),
  ).toBeTruthy();
});

test('with nothing on it there is only the dashed place', () => {
  render(
    <StoryStick
      input={{ duration: 0, steps: [] }}
      label="Story stick"
      width={width}
      onStep={jest.fn()}
    />,
  );
  expect(screen.queryByRole('slider')).toBeNull();
});

/** jsdom has no PointerEvent; the fields the stick reads are these. */
class TestPointerEvent extends MouseEvent {
  readonly pointerId: number;
  readonly pointerType: string;
  constructor(type: string, init: PointerEventInit = {}) {
    super(type, init);
    this.pointerId = init.pointerId ?? 0;
    this.pointerType = init.pointerType ?? '';
  }
}
beforeAll(() => {
  window.PointerEvent ??= TestPointerEvent as unknown as typeof PointerEvent;
});

const press = (x: number) => ({ button: 0, pointerId: 1, clientX: x, pointerType: 'mouse' });

describe('finger and mouse', () => {
  test('a press goes to the place in the clip, and the drag follows', () => {
    const seek = jest.fn();
    render(<StoryStick input={input} label="Story stick" width={width} onSeek={seek} />);
    fireEvent.pointerDown(slider(), press(2 + 8 + 50));
    expect(seek).toHaveBeenLastCalledWith(50);
    fireEvent.pointerMove(slider(), press(2 + 8 + 70));
    expect(seek).toHaveBeenLastCalledWith(70);
    fireEvent.pointerUp(slider(), press(2 + 8 + 70));
    fireEvent.pointerMove(slider(), press(2 + 8 + 20));
    expect(seek).toHaveBeenLastCalledWith(70);
  });

  test('where there is no clip it chooses the step', () => {
    const go = jest.fn();
    render(<StoryStick input={input} label="Story stick" width={width} onStep={go} />);
    fireEvent.pointerDown(slider(), press(2 + 8 + 65));
    expect(go).toHaveBeenCalledWith('s4');
  });
});

describe('drafting', () => {
  const drafting = () => ({
    captionStarts: [44.2],
    onMoveMark: jest.fn(),
    onMarkIn: jest.fn(),
    onMarkOut: jest.fn(),
    onNewStep: jest.fn(),
    onTakeMeasure: jest.fn(),
    onMoveStep: jest.fn(),
  });
  const show = (d = drafting(), selected = 's3') => {
    render(
      <StoryStick
        input={input}
        label="Story stick"
        width={width}
        selected={selected}
        onSeek={jest.fn()}
        onStep={jest.fn()}
        drafting={d}
      />,
    );
    return d;
  };

  test('a dragged mark snaps to the start of a caption and is put down once', () => {
    const d = show();
    fireEvent.pointerDown(slider(), press(2 + 8 + 41));
    fireEvent.pointerMove(slider(), press(2 + 8 + 43));
    expect(d.onMoveMark).not.toHaveBeenCalled();
    fireEvent.pointerUp(slider(), press(2 + 8 + 46));
    expect(d.onMoveMark).toHaveBeenCalledTimes(1);
    expect(d.onMoveMark).toHaveBeenCalledWith('s3', 44.2, 'drag');
  });

  test('with Shift it stands on tenths', () => {
    const d = show();
    fireEvent.pointerDown(slider(), press(2 + 8 + 41));
    fireEvent.pointerUp(slider(), { ...press(2 + 8 + 46), shiftKey: true });
    expect(d.onMoveMark).toHaveBeenCalledWith('s3', 46, 'drag');
  });

  test('it does not pass its neighbour', () => {
    const d = show();
    fireEvent.pointerDown(slider(), press(2 + 8 + 41));
    fireEvent.pointerUp(slider(), press(2 + 8 + 95));
    expect(d.onMoveMark).toHaveBeenCalledWith('s3', 59.9, 'drag');
  });

  test.each([
    ['{ArrowRight}', 40.1],
    ['{ArrowLeft}', 39.9],
    ['{Shift>}{ArrowRight}{/Shift}', 41],
    ['{Shift>}{ArrowLeft}{/Shift}', 39],
  ])('%s nudges the mark to %d', async (keys, start) => {
    const d = show();
    await userEvent.tab();
    await userEvent.keyboard(keys);
    expect(d.onMoveMark).toHaveBeenCalledWith('s3', start, 'nudge');
  });

  test('Alt with up and down moves the step in order', async () => {
    const d = show();
    await userEvent.tab();
    await userEvent.keyboard('{Alt>}{ArrowUp}{/Alt}');
    expect(d.onMoveStep).toHaveBeenCalledWith('s3', -1);
    await userEvent.keyboard('{Alt>}{ArrowDown}{/Alt}');
    expect(d.onMoveStep).toHaveBeenLastCalledWith('s3', 1);
  });

  test('I, O, S and M work on the page but not in a field', async () => {
    const d = drafting();
    render(
      <>
        <input aria-label="Title" />
        <StoryStick input={input} label="Story stick" width={width} drafting={d} />
      </>,
    );
    await userEvent.type(screen.getByLabelText('Title'), 'miso');
    expect(d.onMarkIn).not.toHaveBeenCalled();
    await userEvent.tab();
    await userEvent.keyboard('iOsm');
    for (const key of [d.onMarkIn, d.onMarkOut, d.onNewStep, d.onTakeMeasure])
      expect(key).toHaveBeenCalledTimes(1);
  });

  test('a moved mark moves the end of the stretch before it', () => {
    const moved = withMark(input, 's3', 45).steps;
    expect([moved[1]?.end, moved[2]?.start, moved[2]?.end]).toEqual([45, 45, 60]);
  });
});

describe('at the bench', () => {
  test('is an upright slider; a press chooses the step', () => {
    const go = jest.fn();
    render(<BenchStick input={input} label="Bench stick" height={116} onStep={go} />);
    expect(slider().getAttribute('aria-orientation')).toBe('vertical');
    fireEvent.click(slider(), { clientY: 4 + 8 + 65 });
    expect(go).toHaveBeenCalledWith('s4');
  });
});

describe('on the plan page', () => {
  test('is the list of steps, with words and times', () => {
    render(
      <PlanStick
        steps={input.steps}
        label="Steps"
        headingLevel={3}
        renderBody={(s) => <>{`about ${s.title}`}</>}
      />,
    );
    const items = within(screen.getByRole('list', { name: 'Steps' })).getAllByRole('listitem');
    expect(items).toHaveLength(5);
    expect(items[1]?.textContent).toContain('about Title 2');
    expect(items[1]?.textContent).toContain('0:20');
    expect(items[0]?.textContent).toContain('Done');
    expect(screen.getByRole('heading', { level: 3, name: 'Title 4' })).toBeTruthy();
  });
});
