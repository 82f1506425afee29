import { act, fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { Bench } from '@/components/bench/bench';
import type { SettingValues, TrammelSpec } from '@/lib/scene/bench-spec';
import { trainInLine } from '@/lib/scene/train-model';
import { dispatchFrames, stubCanvas, stubMedia } from './stubs';

const row = trainInLine(4, [[16], [48], [16]]);
const trammel: TrammelSpec = {
  bench: 'trammel',
  farPin: 250,
  nearPin: 150,
  farRunsIn: 'north-south',
  slider: 45,
  groove: 260,
  skew: 0,
  held: 'board',
  drive: 0,
};

/** The canvas comes as a bundle of its own. */
const loading = { timeout: 30_000 };

let media: ReturnType<typeof stubMedia>;

beforeEach(() => {
  stubCanvas();
  media = stubMedia();
});

afterEach(() => {
  vi.restoreAllMocks();
  vi.unstubAllGlobals();
  vi.useRealTimers();
});

function strip(label: string): string {
  return screen.getByText(label, { selector: 'dt' }).nextElementSibling?.textContent ?? '';
}

describe('a bench', { timeout: 60_000 }, () => {
  it('shows its still picture from the first paint, named and described', () => {
    const { container } = render(<Bench spec={row} title="Row of three" />);
    const drawing = screen.getByRole('img', { name: 'Row of three' });
    expect(drawing).toHaveAccessibleDescription(/3 arbors\. Wheel 1, 16 teeth, on the crank/);
    expect(container.querySelector('svg.drawing')).not.toBeNull();
  });

  it('goes one tooth on by a press, back by another, and takes both back', async () => {
    const user = userEvent.setup();
    render(<Bench spec={row} title="Row of three" />);
    await user.click(screen.getByRole('button', { name: 'Step' }));
    expect(strip('Crank, turns')).toBe('0.06 right');
    await user.click(screen.getByRole('button', { name: 'Step back' }));
    await user.click(screen.getByRole('button', { name: 'Step back' }));
    expect(strip('Crank, turns')).toBe('0.06 left');
    await user.click(screen.getByRole('button', { name: 'Undo' }));
    expect(strip('Crank, turns')).toBe('0.00');
    expect(screen.getByRole('button', { name: 'Undo' })).toBeDisabled();
  });

  it('takes a typed drive as a woodworker writes it, and refuses what it cannot read', async () => {
    const user = userEvent.setup();
    render(<Bench spec={row} title="Row of three" />);
    const typed = screen.getByRole('spinbutton', { name: /Crank/ });
    await user.clear(typed);
    await user.type(typed, '1 1/2{Enter}');
    expect(strip('Crank, turns')).toBe('1.50 right');
    expect(strip('Last wheel, turns')).toBe('1.50 right');
    await user.clear(typed);
    await user.type(typed, 'twice');
    expect(typed).toBeInvalid();
    expect(screen.getByRole('alert')).toHaveTextContent(/./);
    expect(strip('Crank, turns')).toBe('1.50 right');
  });

  it('is driven by the arrow keys', () => {
    render(<Bench spec={trammel} title="Trammel" />);
    const bar = screen.getByRole('spinbutton', { name: /Bar/ });
    fireEvent.keyDown(bar, { key: 'ArrowUp' });
    fireEvent.keyDown(bar, { key: 'PageUp' });
    expect(strip('Bar')).toBe('11.0°');
    fireEvent.change(screen.getByRole('slider', { name: /Bar/ }), { target: { value: '90' } });
    expect(strip('Bar')).toBe('90.0°');
  });

  it('tells what is set, at the start and after each change', async () => {
    const user = userEvent.setup();
    const told: SettingValues[] = [];
    const tell = (values: SettingValues) => told.push(values);
    render(<Bench spec={trammel} title="Trammel" onSettingChange={tell} />);
    await user.click(screen.getByRole('button', { name: 'Far pin, from the pen: more' }));
    await user.selectOptions(screen.getByRole('combobox', { name: 'The far pin runs in' }), [
      'east-west',
    ]);
    expect(told).toEqual([
      { farPin: 250, nearPin: 150, farRunsIn: 'north-south' },
      { farPin: 251, nearPin: 150, farRunsIn: 'north-south' },
      { farPin: 251, nearPin: 150, farRunsIn: 'east-west' },
    ]);
    await user.click(screen.getByRole('button', { name: 'Back to the start' }));
    expect(told.at(-1)).toEqual(told[0]);
  });

  it('offers only the settings it is told to', () => {
    render(<Bench spec={{ ...trammel, controls: ['nearPin'] }} title="Trammel" />);
    expect(screen.getByRole('spinbutton', { name: /Near pin/ })).toBeInTheDocument();
    expect(screen.queryByRole('spinbutton', { name: /Far pin/ })).toBeNull();
  });

  it('puts a wheel from the tray on an arbor by two presses, and takes it off again', async () => {
    const user = userEvent.setup();
    render(<Bench spec={row} title="Row of three" />);
    const middle = screen.getByRole('spinbutton', { name: 'Arbor 2' });
    await user.click(screen.getByRole('button', { name: 'wheel of 24 teeth' }));
    expect(screen.getByRole('button', { name: 'wheel of 24 teeth' })).toBePressed();
    expect(screen.getByRole('status')).toHaveTextContent('In your hand: wheel of 24 teeth.');
    await user.keyboard('{Escape}');
    expect(screen.queryByRole('button', { name: 'Arbor 2' })).toBeNull();
    await user.click(screen.getByRole('button', { name: 'wheel of 24 teeth' }));
    await user.click(screen.getByRole('button', { name: 'Arbor 2' }));
    expect(middle).toHaveValue('24');
    expect(screen.getByRole('status')).toHaveTextContent('Pull one on to the drawing');
    await user.click(screen.getByRole('button', { name: 'Undo' }));
    expect(middle).toHaveValue('48');
  });

  it('says its limits with their amounts', async () => {
    const user = userEvent.setup();
    render(<Bench spec={{ ...trammel, groove: 200 }} title="Trammel" />);
    expect(screen.getByText(/more groove needed/)).toHaveTextContent(
      '45.0 mm more groove needed: each pin travels 200.0 mm.',
    );
    await user.click(screen.getByText('Plot and numbers'));
    const table = screen.getByRole('table', { name: 'Sizes' });
    expect(within(table).getByRole('cell', { name: '245.0 mm' })).toBeInTheDocument();
  });

  it('gives nothing away while it is locked', () => {
    render(<Bench spec={row} title="Row" locked lockedNotice={<p>Commit first.</p>} />);
    expect(screen.getByText('Commit first.')).toBeInTheDocument();
    expect(screen.queryByRole('button')).toBeNull();
    expect(screen.queryByRole('slider')).toBeNull();
    expect(document.body.textContent).not.toMatch(/Last wheel|right|left|One turn/);
    expect(document.querySelector('canvas')).toBeNull();
  });

  it('begins anew with another spec, and not with the same one written again', async () => {
    const user = userEvent.setup();
    const { rerender } = render(<Bench spec={row} title="Row" />);
    await user.click(screen.getByRole('button', { name: 'Step' }));
    rerender(<Bench spec={structuredClone(row)} title="Row" />);
    expect(strip('Crank, turns')).toBe('0.06 right');
    rerender(<Bench spec={trainInLine(4, [[16], [24], [16]])} title="Row" />);
    expect(strip('Crank, turns')).toBe('0.00');
  });
});

describe('running', { timeout: 60_000 }, () => {
  it('makes the position a function of the time, and stops drawing when paused', async () => {
    const frames = dispatchFrames();
    render(<Bench spec={row} title="Row" />);
    fireEvent.click(screen.getByRole('button', { name: 'Turn' }));
    act(() => frames.run(1000));
    act(() => frames.run(4000));
    // 10 rpm for three seconds: half a turn.
    expect(strip('Crank, turns')).toBe('0.50 right');
    fireEvent.click(screen.getByRole('button', { name: 'Pause' }));
    expect(frames.waiting()).toBe(0);
    expect(strip('Crank, turns')).toBe('0.50 right');
  });

  it('goes in steps where less motion is asked for', () => {
    media.reduce();
    const frames = dispatchFrames();
    render(<Bench spec={row} title="Row" />);
    fireEvent.click(screen.getByRole('button', { name: 'Turn' }));
    act(() => frames.run(0));
    act(() => frames.run(650));
    expect(strip('Crank, turns')).toBe('0.00');
    act(() => frames.run(750));
    expect(strip('Crank, turns')).toBe('0.06 right');
  });

  it('does not begin by itself', () => {
    const frames = dispatchFrames();
    render(<Bench spec={row} title="Row" />);
    expect(frames.waiting()).toBe(0);
  });

  it('says where it stands once it has come to rest', async () => {
    vi.useFakeTimers();
    render(<Bench spec={row} title="Row" />);
    fireEvent.click(screen.getByRole('button', { name: 'Step' }));
    const words = document.querySelector('[aria-live]');
    expect(words).toHaveTextContent('has made 0 turns');
    act(() => vi.advanceTimersByTime(700));
    expect(words).toHaveTextContent('has made 0.06 turns to the right');
  });
});

describe('the canvas', { timeout: 60_000 }, () => {
  it('stands over the still picture at its size and is painted from the same scene', async () => {
    const written = stubCanvas({ width: 640, height: 400 });
    render(<Bench spec={row} title="Row" />);
    const { default: Konva } = await import('konva/lib/Core');
    await waitFor(() => expect(document.querySelector('[data-live=true]')).not.toBeNull(), loading);
    expect(Konva.stages.at(-1)?.width()).toBe(640);
    expect(written).toEqual(expect.arrayContaining(['16', '48', '128 mm']));
  });

  it('turns the crank by the hand', async () => {
    stubCanvas({ width: 640, height: 400 });
    render(<Bench spec={row} title="Row" />);
    const { default: Konva } = await import('konva/lib/Core');
    await waitFor(() => expect(document.querySelector('[data-live=true]')).not.toBeNull(), loading);
    const stage = Konva.stages.at(-1);
    const crank = stage?.findOne((node: { id: () => string }) => node.id() === 'crank');
    const start = crank?.position() ?? { x: 0, y: 0 };
    const arbor = stage
      ?.findOne((node: { id: () => string }) => node.id() === 'wheel:0:0')
      ?.position() ?? { x: 0, y: 0 };
    const container = stage?.container();
    if (!crank || !container) throw new Error('a crank on a stage');
    const pointer = (type: string, x: number, y: number) =>
      new MouseEvent(type, { clientX: x, clientY: y, bubbles: true });
    act(() => {
      crank.fire(
        'pointerdown',
        { evt: pointer('pointerdown', start.x, start.y), target: crank },
        true,
      );
    });
    // A quarter turn to the right about the arbor: on the page, (x, y) goes to (−y, x).
    const [dx, dy] = [start.x - arbor.x, start.y - arbor.y];
    act(() => {
      container.dispatchEvent(pointer('pointermove', arbor.x - dy, arbor.y + dx));
      container.dispatchEvent(pointer('pointerup', arbor.x - dy, arbor.y + dx));
    });
    expect(strip('Crank, turns')).toBe('0.25 right');
  });

  it('takes a wheel that is pulled from the tray and let go over an arbor', async () => {
    stubCanvas({ width: 640, height: 400 });
    render(<Bench spec={row} title="Row" />);
    const { default: Konva } = await import('konva/lib/Core');
    await waitFor(() => expect(document.querySelector('[data-live=true]')).not.toBeNull(), loading);
    const stage = Konva.stages.at(-1);
    const arbor = stage?.findOne((node: { id: () => string }) => node.id() === 'wheel:1:0');
    const sheet = stage?.content;
    if (!arbor || !sheet) throw new Error('an arbor on a stage');
    const wheel = screen.getByRole('button', { name: 'wheel of 60 teeth' });
    const pull = (over: Element, type: string, at: { x: number; y: number }) =>
      fireEvent(
        over,
        new PointerEvent(type, { clientX: at.x, clientY: at.y, bubbles: true, pointerId: 1 }),
      );
    const bare = { x: 3, y: 3 };
    pull(wheel, 'pointerdown', { x: 10, y: 500 });
    pull(wheel, 'pointermove', { x: 12, y: 502 });
    expect(wheel).not.toBePressed();
    pull(sheet, 'pointermove', bare);
    expect(wheel).toBePressed();
    pull(sheet, 'pointerup', bare);
    expect(screen.getByRole('spinbutton', { name: 'Arbor 2' })).toHaveValue('48');
    expect(wheel).toBePressed();
    pull(sheet, 'pointerup', arbor.position());
    expect(screen.getByRole('spinbutton', { name: 'Arbor 2' })).toHaveValue('60');
    expect(wheel).not.toBePressed();
  });
});
