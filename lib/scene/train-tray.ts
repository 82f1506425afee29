import type { Point } from '@/lib/geometry/point';
import type { TrayControl } from './bench-model';
import type { Arbor } from './bench-spec';
import type { TrainSetup } from './train-setup';

/** The wheels that lie in the tray, by their teeth: those that the lesson and its trains use. */
const trayTeeth = [8, 10, 12, 14, 16, 20, 24, 30, 36, 40, 48, 60, 72, 96];

/** The tray of wheels, with every place of the train that takes one. */
export function wheelTray(arbors: readonly Arbor[]): TrayControl {
  return {
    kind: 'tray',
    key: 'teeth',
    label: 'Wheels in the tray, by their teeth',
    parts: trayTeeth.map((teeth) => ({
      value: teeth,
      label: String(teeth),
      name: `wheel of ${teeth} teeth`,
    })),
    places: arbors.flatMap((arbor, index) =>
      arbor.wheels.map((_, wheel) => ({
        key: wheelKey(index, wheel),
        label: wheelName(arbor, index, wheel),
      })),
    ),
  };
}

/** What a wheel's place is called: `Arbor 2`, or of a pair `Arbor 2, hands on`. */
export function wheelName({ wheels }: Arbor, arbor: number, wheel: number): string {
  const which = wheels.length === 1 ? '' : wheel === 0 ? ', takes' : ', hands on';
  return `Arbor ${arbor + 1}${which}`;
}

/** The wheel whose face lies under a point, the smallest where several do; null on bare board. */
export function wheelUnder({ spec, wheels }: TrainSetup, at: Point): string | null {
  if (spec.layout !== 'free' || spec.controls?.includes('teeth') === false) return null;
  const under = wheels
    .filter(({ centre, tipRadius }) => Math.hypot(at.x - centre.x, at.y - centre.y) <= tipRadius)
    .sort((a, b) => a.tipRadius - b.tipRadius);
  const [wheel] = under;
  return wheel ? wheelKey(wheel.arbor, wheel.wheel) : null;
}

function wheelKey(arbor: number, wheel: number): string {
  return `teeth:${arbor}:${wheel}`;
}
