import type { Point } from '@/lib/geometry/point';
import type { Field } from '@/lib/quantities/field';
import type { BenchSpec, SettingValues } from './bench-spec';
import type { Bounds, Scene } from './scene';

/** Where the driver stands, and the stretch of the drive it has swept since the start. */
export interface DriveState {
  readonly drive: number;
  readonly swept: { readonly from: number; readonly to: number };
}

/** What the learner has chosen to see. */
export interface Showing {
  readonly tracing: boolean;
  readonly dimensions: boolean;
}

/** One number of the title strip, in words and units. */
export interface Readout {
  readonly key: string;
  readonly label: string;
  readonly value: string;
}

/** The driver's control; `toShown` and `fromShown` are between radians or mm and what is read. */
export interface DriveControl {
  /** What its button does: `Turn`, `Lead`. */
  readonly verb: string;
  readonly label: string;
  /** What the shown number counts: `turns to the right`, `°`, `mm along the drawing`. */
  readonly unit: string;
  readonly least: number;
  readonly most: number;
  /** One notch of the slider and one press of an arrow key, in what is shown. */
  readonly notch: number;
  /** What Step goes on by, in what is shown. */
  readonly step: number;
  readonly places: number;
  /** How a typed value is read. */
  readonly field: Field;
  /** The shown range after which everything is as before, or null when it never is. */
  readonly round: number | null;
  readonly toShown: (drive: number) => number;
  readonly fromShown: (shown: number) => number;
  readonly pace: PaceControl;
  readonly start: number;
}

/** How fast it runs by itself; one unit of pace moves the drive by `perSecond`. */
export interface PaceControl {
  readonly unit: string;
  readonly least: number;
  readonly most: number;
  readonly step: number;
  readonly usual: number;
  readonly perSecond: number;
}

/** A setting given by a number; bounds and steps in the unit that is shown. */
export interface NumberControl {
  readonly kind: 'number';
  readonly key: string;
  readonly label: string;
  readonly unit: string;
  readonly value: number;
  /** The value as it stands in its box. */
  readonly text: string;
  readonly least: number;
  readonly most: number;
  readonly step: number;
  /** How a typed value is read. */
  readonly field: Field;
  /** Whether a slider helps. */
  readonly slides?: boolean;
  /** The value as words, for those who hear it. */
  readonly spoken: string;
}

/** A setting given by a choice of words. */
export interface ChoiceControl {
  readonly kind: 'choice';
  readonly key: string;
  readonly label: string;
  readonly value: string;
  readonly options: readonly { readonly value: string; readonly label: string }[];
}

/** Something done to the mechanism by one press. */
export interface ActionControl {
  readonly kind: 'action';
  readonly key: string;
  readonly label: string;
}

/** Parts that lie at hand, each to be put where one of that kind is: by pressing or by dragging. */
export interface TrayControl {
  readonly kind: 'tray';
  readonly key: string;
  readonly label: string;
  readonly parts: readonly TrayPart[];
  /** Where a part may be put; `key` is the setting that takes its value. */
  readonly places: readonly { readonly key: string; readonly label: string }[];
}

export interface TrayPart {
  readonly value: number;
  /** What stands on it: `24`. */
  readonly label: string;
  /** What it is: `wheel of 24 teeth`. */
  readonly name: string;
}

export type SettingControl = NumberControl | ChoiceControl | ActionControl | TrayControl;

/** A place on the drawing that the hand may take hold of. */
export interface Handle {
  readonly id: string;
  readonly at: Point;
  /** Radius within which the hand takes hold, mm; never less than a fingertip on the page. */
  readonly reach: number;
  readonly moves: 'drive' | 'setting';
}

/** What became of a pull at a handle. */
export type Dragged =
  | { readonly kind: 'drive'; readonly drive: number }
  | { readonly kind: 'spec'; readonly spec: BenchSpec }
  | { readonly kind: 'nothing' };

/** The numbers behind the plot and the drawing. */
export interface BenchTable {
  readonly caption: string;
  readonly head: readonly string[];
  readonly rows: readonly (readonly string[])[];
}

/** Output against drive. */
export interface Plot {
  readonly title: string;
  readonly across: Axis;
  readonly up: Axis;
  readonly lines: readonly PlotLine[];
  /** Where the drive stands now, one point a line. */
  readonly now: (drive: number) => readonly Point[];
}

/** One axis of a plot, with the values its ticks stand at. */
export interface Axis {
  readonly label: string;
  readonly least: number;
  readonly most: number;
  readonly ticks: readonly number[];
}

export interface PlotLine {
  readonly label: string;
  readonly role: 'ink' | 'brass' | 'chalk' | 'pencil';
  readonly dashed: boolean;
  readonly points: readonly Point[];
}

/** A mechanism set up for drawing: everything a bench shows, as functions of the drive alone. */
export interface BenchModel {
  readonly spec: BenchSpec;
  readonly bounds: Bounds;
  readonly drive: DriveControl;
  /** The nearest drive the mechanism lets the driver stand at. */
  readonly admit: (drive: number) => number;
  readonly scene: (state: DriveState, showing: Showing) => Scene;
  readonly readouts: (drive: number) => readonly Readout[];
  readonly describe: (drive: number) => string;
  /** What does not work, each in a sentence with its amount. */
  readonly limits: (drive: number) => readonly string[];
  /** What has become of the figure where it is a special one, and nothing is wrong with it. */
  readonly remarks: readonly string[];
  /** The numbers, `pace` being the one that is set. */
  readonly tables: (drive: number, pace: number) => readonly BenchTable[];
  readonly plot: Plot | null;
  readonly handles: (drive: number) => readonly Handle[];
  /** What pulling a handle from one place to another does, `drive` being where it was taken hold. */
  readonly drag: (handle: string, from: Point, to: Point, drive: number) => Dragged;
  readonly controls: readonly SettingControl[];
  /** The setting that a part from the tray changes when it is put down here, or null on bare board. */
  readonly placeAt: (at: Point) => string | null;
  /** The bench with one setting changed; `value` in what is shown. */
  readonly set: (key: string, value: number | string) => BenchSpec;
  /** What an exercise asks for: mm, counts and words by the key of each control. */
  readonly values: SettingValues;
}
