import { chainLength, sprocketDiameter, toothedPulleyDiameter } from '@/lib/kinematics/belt/chain';
import { beltRoundMany } from '@/lib/kinematics/belt/many-wheels';
import { beltSpeed, beltTurns } from '@/lib/kinematics/belt/speed';
import { steppedCones } from '@/lib/kinematics/belt/stepped-cones';
import { bandsawBlade, beltLoop, centresForLoop } from '@/lib/kinematics/belt/two-wheels';
import type { Lay } from '@/lib/kinematics/belt/two-wheels';
import { degree, expectOutcome, number, numbers, pairs, rows, rpm, text } from '../inputs';
import type { Family, Inputs } from '../inputs';

export const beltAnswers: Family = {
  belt_open: (inputs) => {
    const loop = expectOutcome(beltLoop(twoWheels(inputs, 'open')), 'loop');
    return {
      length_mm: loop.length,
      length_approx_mm: loop.shortLength,
      wrap_large_deg: loop.firstWrap / degree,
      wrap_small_deg: loop.secondWrap / degree,
      large_rpm: largeSpeed(inputs, 'open'),
      belt_speed_m_s:
        beltSpeed(number(inputs, 'small_diameter_mm'), number(inputs, 'small_rpm') * rpm) / 1000,
    };
  },
  belt_crossed: (inputs) => {
    const loop = expectOutcome(beltLoop(twoWheels(inputs, 'crossed')), 'loop');
    return {
      length_mm: loop.length,
      wrap_deg: loop.firstWrap / degree,
      large_rpm: largeSpeed(inputs, 'crossed'),
    };
  },
  belt_centre_from_length: (inputs) => {
    const wheels = {
      first: number(inputs, 'large_diameter_mm'),
      second: number(inputs, 'small_diameter_mm'),
      lay: 'open' as const,
    };
    const outcome = centresForLoop(wheels, number(inputs, 'length_mm'));
    const { distance, shortDistance } = expectOutcome(outcome, 'centres');
    return { centre_distance_mm: distance, centre_distance_approx_mm: shortDistance };
  },
  stepped_pulleys: (inputs) => {
    const outcome = steppedCones({
      centreDistance: number(inputs, 'centre_distance_mm'),
      firstDriver: 2 * number(inputs, 'first_driver_radius_mm'),
      ratios: numbers(inputs, 'speed_ratios_list'),
      lay: lay(inputs),
    });
    const { steps, length } = expectOutcome(outcome, 'cones');
    return {
      driver_radii_mm_list: steps.map(({ driver }) => driver / 2),
      driven_radii_mm_list: steps.map(({ driven }) => driven / 2),
      length_mm: length,
    };
  },
  belt_speed_slip: (inputs) => {
    const stages = pairs(inputs, 'driver_driven_pairs_mm').map(([driver, driven]) => ({
      driver,
      driven,
    }));
    const turns = beltTurns(stages, {
      thickness: number(inputs, 'belt_thickness_mm'),
      slip: number(inputs, 'slip_pct') / 100,
    });
    return { output_rpm: number(inputs, 'input_rpm') * turns };
  },
  bandsaw_blade: (inputs) => ({
    length_mm: bandsawBlade(
      number(inputs, 'wheel_diameter_mm'),
      number(inputs, 'centre_distance_mm'),
    ),
  }),
  belt_three_pulleys: (inputs) => {
    const wheels = rows(inputs, 'pulleys_xyr_mm').map(([x = 0, y = 0, radius = 0]) => ({
      centre: { x, y },
      radius,
    }));
    const { length, wraps } = expectOutcome(beltRoundMany(wheels), 'belt');
    return { length_mm: length, wraps_deg_list: wraps.map((wrap) => wrap / degree) };
  },
  roller_chain: (inputs) => {
    const chain = {
      pitch: number(inputs, 'pitch_mm'),
      firstTeeth: number(inputs, 'teeth1_count'),
      secondTeeth: number(inputs, 'teeth2_count'),
    };
    const { pitches, links, centreDistance } = chainLength(
      chain,
      number(inputs, 'centre_distance_mm'),
    );
    return {
      pitch_diameter1_mm: sprocketDiameter(chain.pitch, chain.firstTeeth),
      pitch_diameter2_mm: sprocketDiameter(chain.pitch, chain.secondTeeth),
      length_pitches: pitches,
      links_count: links,
      centre_for_links_mm: centreDistance,
    };
  },
  timing_pulley: (inputs) => ({
    pitch_diameter_mm: toothedPulleyDiameter(
      number(inputs, 'pitch_mm'),
      number(inputs, 'teeth_count'),
    ),
  }),
};

function twoWheels(inputs: Inputs, belt: Lay) {
  return {
    first: number(inputs, 'large_diameter_mm'),
    second: number(inputs, 'small_diameter_mm'),
    centreDistance: number(inputs, 'centre_distance_mm'),
    lay: belt,
  };
}

function largeSpeed(inputs: Inputs, belt: Lay): number {
  const stage = {
    driver: number(inputs, 'small_diameter_mm'),
    driven: number(inputs, 'large_diameter_mm'),
    lay: belt,
  };
  return number(inputs, 'small_rpm') * beltTurns([stage]);
}

function lay(inputs: Inputs): Lay {
  const name = text(inputs, 'belt_string');
  if (name === 'open' || name === 'crossed') return name;
  throw new RangeError(`belt_string is ${name}`);
}
