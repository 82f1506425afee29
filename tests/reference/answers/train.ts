import { planetsAssembly } from '@/lib/kinematics/train/assembly';
import { changeWheelRatio } from '@/lib/kinematics/train/change-wheels';
import { clockBeats } from '@/lib/kinematics/train/clock';
import { continuedFraction } from '@/lib/kinematics/train/continued-fraction';
import {
  bevelDifferentialMeshes,
  carriedWheelMeshes,
  compoundPlanetaryMeshes,
  fergusonMeshes,
  planetaryMeshes,
  revertedEpicyclicMeshes,
  ringTeeth,
} from '@/lib/kinematics/train/epicyclic';
import type { TrainMesh } from '@/lib/kinematics/train/graph';
import { wormRatio } from '@/lib/kinematics/gear/worm';
import { huntingTeeth } from '@/lib/kinematics/train/hunting';
import { planetaryDrive } from '@/lib/kinematics/train/planetary';
import type { PlanetaryMember } from '@/lib/kinematics/train/planetary';
import { compoundTrain, simpleTrain, trainProduct } from '@/lib/kinematics/train/ratio';
import { closingWheel, revertedTeeth } from '@/lib/kinematics/train/reverted';
import { nearestTrain, wheelsFrom } from '@/lib/kinematics/train/search';
import { turnsOfMeshes } from '@/lib/kinematics/train/turns';
import { readFraction, toNumber } from '@/lib/numeric/fraction';
import type { Fraction } from '@/lib/numeric/fraction';
import { expectOutcome, number, numbers, pairs, text } from '../inputs';
import type { Answers, Family, Inputs } from '../inputs';

export const trainAnswers: Family = {
  simple_train: (inputs) => {
    const { value } = simpleTrain(numbers(inputs, 'teeth_list'));
    return { output_rpm: number(inputs, 'input_rpm') * value, train_value: value };
  },
  compound_train: (inputs) => {
    const { value } = compoundTrain(pairs(inputs, 'driver_driven_pairs'));
    return { output_rpm: number(inputs, 'input_rpm') * value, train_value: value };
  },
  train_product: (inputs) =>
    asFraction(trainProduct(pairs(inputs, 'driver_driven_pairs')), 'train_value'),
  reverted_train: (inputs) => {
    const made = revertedTeeth(
      number(inputs, 'stage1_ratio'),
      number(inputs, 'stage2_ratio'),
      number(inputs, 'min_teeth_count'),
    );
    return {
      teeth1_count: made.firstPinion,
      teeth2_count: made.firstWheel,
      teeth3_count: made.secondPinion,
      teeth4_count: made.secondWheel,
      tooth_sum_count: made.toothSum,
    };
  },
  reverted_centre: (inputs) => {
    const outcome = closingWheel({
      firstModule: number(inputs, 'module1_mm'),
      firstPinion: number(inputs, 'teeth1_count'),
      firstWheel: number(inputs, 'teeth2_count'),
      secondModule: number(inputs, 'module2_mm'),
      secondPinion: number(inputs, 'teeth3_count'),
    });
    const { teeth, centreDistance, reduction } = expectOutcome(outcome, 'closes');
    return { teeth4_count: teeth, centre_distance_mm: centreDistance, ratio: toNumber(reduction) };
  },
  planetary: (inputs) => {
    const drive = planetaryDrive({
      sunTeeth: number(inputs, 'sun_teeth_count'),
      planetTeeth: number(inputs, 'planet_teeth_count'),
      held: member(inputs, 'fixed_string'),
      driven: member(inputs, 'driven_string'),
    });
    const rpm = (turns: Fraction) => number(inputs, 'driven_rpm') * toNumber(turns);
    return {
      ring_teeth_count: drive.ringTeeth,
      sun_rpm: rpm(drive.turns.sun),
      ring_rpm: rpm(drive.turns.ring),
      carrier_rpm: rpm(drive.turns.carrier),
      planet_rpm: rpm(drive.turns.planet),
      speed_ratio: toNumber(drive.turns[drive.output]),
    };
  },
  planetary_differential: (inputs) => {
    const meshes = planetaryMeshes(
      number(inputs, 'sun_teeth_count'),
      number(inputs, 'planet_teeth_count'),
    );
    const turns = solved(meshes, {
      sun: number(inputs, 'sun_rpm'),
      carrier: number(inputs, 'carrier_rpm'),
    });
    return { ring_rpm: turns('ring'), planet_rpm: turns('planet') };
  },
  epicyclic_two_wheel: (inputs) => {
    const meshes = carriedWheelMeshes(
      number(inputs, 'teeth_a_count'),
      number(inputs, 'teeth_b_count'),
    );
    const turns = solved(meshes, {
      fixed: number(inputs, 'speed_a_rpm'),
      carrier: number(inputs, 'arm_rpm'),
    });
    return { speed_b_rpm: turns('carried') };
  },
  epicyclic_internal_roll: (inputs) => {
    const meshes = carriedWheelMeshes(
      number(inputs, 'ring_teeth_count'),
      number(inputs, 'planet_teeth_count'),
      'inside-a-ring',
    );
    return {
      planet_rpm: solved(meshes, { carrier: number(inputs, 'arm_rpm') }, ['fixed'])('carried'),
    };
  },
  reverted_epicyclic: (inputs) => {
    const meshes = revertedEpicyclicMeshes({
      fixed: number(inputs, 'teeth_b_count'),
      first: number(inputs, 'teeth_e_count'),
      second: number(inputs, 'teeth_d_count'),
      driven: number(inputs, 'teeth_c_count'),
    });
    return {
      speed_c_rpm: solved(meshes, { carrier: number(inputs, 'arm_rpm') }, ['fixed'])('driven'),
    };
  },
  ferguson_paradox: (inputs) => {
    const meshes = fergusonMeshes(
      number(inputs, 'fixed_teeth_count'),
      number(inputs, 'planet_teeth_count'),
      [number(inputs, 'wheel_a_teeth_count'), number(inputs, 'wheel_b_teeth_count')],
    );
    const turns = solved(meshes, { carrier: number(inputs, 'arm_rpm') }, ['fixed']);
    return { wheel_a_rpm: turns('wheel 1'), wheel_b_rpm: turns('wheel 2') };
  },
  sun_and_planet: (inputs) => {
    const meshes = carriedWheelMeshes(
      number(inputs, 'sun_teeth_count'),
      number(inputs, 'planet_teeth_count'),
    );
    const turns = solved(meshes, { carrier: number(inputs, 'arm_rpm') }, ['carried']);
    return { sun_rpm: turns('fixed') };
  },
  bevel_differential: (inputs) => {
    const meshes = bevelDifferentialMeshes();
    const both = { left: number(inputs, 'left_rpm'), right: number(inputs, 'right_rpm') };
    const carrier = solved(meshes, both)('carrier');
    return {
      carrier_rpm: carrier,
      right_when_left_held_rpm: solved(meshes, { carrier }, ['left'])('right'),
    };
  },
  compound_planetary: (inputs) => {
    const meshes = compoundPlanetaryMeshes(
      number(inputs, 'sun_teeth_count'),
      number(inputs, 'planet1_teeth_count'),
      number(inputs, 'planet2_teeth_count'),
      number(inputs, 'ring_teeth_count'),
    );
    return {
      carrier_rpm: solved(meshes, { sun: number(inputs, 'sun_rpm') }, ['ring'])('carrier'),
      ratio_sun_over_carrier: solved(meshes, { carrier: 1 }, ['ring'])('sun'),
    };
  },
  planet_assembly: (inputs) => {
    const spec = {
      sunTeeth: number(inputs, 'sun_teeth_count'),
      planetTeeth: number(inputs, 'planet_teeth_count'),
      planets: number(inputs, 'planets_count'),
      module: number(inputs, 'module_mm'),
    };
    const { even, tipGap, room } = planetsAssembly(spec);
    return {
      ring_teeth_count: ringTeeth(spec.sunTeeth, spec.planetTeeth),
      even_spacing_bool: even,
      tip_gap_mm: tipGap,
      room_bool: room,
    };
  },
  hunting_tooth: (inputs) => {
    const met = huntingTeeth(number(inputs, 'teeth1_count'), number(inputs, 'teeth2_count'));
    return {
      turns1_count: met.firstTurns,
      turns2_count: met.secondTurns,
      hunting_bool: met.hunting,
    };
  },
  continued_fraction: (inputs) => {
    const value = readFraction(text(inputs, 'value_string'));
    const { quotients, rungs } = continuedFraction(value, number(inputs, 'terms_count'));
    return {
      quotients_list: quotients.map(Number),
      numerators_list: rungs.map(({ numerator }) => Number(numerator)),
      denominators_list: rungs.map(({ denominator }) => Number(denominator)),
    };
  },
  best_gear_pair: (inputs) => {
    const { pairs: found, relativeError } = nearest(inputs, 1);
    return {
      teeth1_count: found[0]?.[0],
      teeth2_count: found[0]?.[1],
      relative_error: relativeError,
    };
  },
  best_two_stage: (inputs) => {
    const { reached, relativeError } = nearest(inputs, 2);
    return { ...asFraction(reached, 'ratio_reached'), relative_error: relativeError };
  },
  clock_beats: (inputs) => {
    const leaves = numbers(inputs, 'pinion_leaves_list');
    const wheels = numbers(inputs, 'wheel_teeth_list');
    const beats = clockBeats(
      wheels.map((teeth, index) => [teeth, leaves[index] ?? Number.NaN]),
      number(inputs, 'escape_teeth_count'),
    );
    return {
      beats_per_hour: beats.beatsPerHour,
      beat_s: beats.beat,
      pendulum_mm: beats.pendulum,
    };
  },
  worm: (inputs) => {
    const ratio = wormRatio(number(inputs, 'starts_count'), number(inputs, 'wheel_teeth_count'));
    return { ratio, wheel_rpm: number(inputs, 'worm_rpm') / ratio };
  },
  change_gears: (inputs) =>
    asFraction(changeWheelRatio(number(inputs, 'lead_tpi'), number(inputs, 'pitch_mm')), 'ratio'),
};

/** Turns by body, of a train that must be settled. */
function solved(
  meshes: readonly TrainMesh[],
  drives: Readonly<Record<string, number>>,
  held: readonly string[] = [],
): (body: string) => number {
  const { turns } = expectOutcome(turnsOfMeshes(meshes, drives, held), 'turns');
  return (body) => {
    const value = turns.get(body);
    if (value === undefined) throw new Error(`the train has no ${body}`);
    return value;
  };
}

function nearest(inputs: Inputs, stages: 1 | 2) {
  const wheels = wheelsFrom(number(inputs, 'min_teeth_count'), number(inputs, 'max_teeth_count'));
  const outcome = nearestTrain({ ratio: number(inputs, 'ratio'), wheels, reuse: true }, stages);
  return expectOutcome(outcome, 'found');
}

function member(inputs: Inputs, key: string): PlanetaryMember {
  const name = text(inputs, key);
  if (name === 'sun' || name === 'ring' || name === 'carrier') return name;
  throw new RangeError(`${key} is ${name}`);
}

function asFraction(value: Fraction, key: string): Answers {
  return {
    [key]: toNumber(value),
    numerator_count: Number(value.numerator),
    denominator_count: Number(value.denominator),
  };
}
