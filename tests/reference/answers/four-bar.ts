import { cognates } from '@/lib/kinematics/linkage/cognates';
import {
  fourBarAssembly,
  fourBarPosition,
  type FourBarLengths,
} from '@/lib/kinematics/linkage/four-bar';
import { crankLimits, grashofCount } from '@/lib/kinematics/linkage/four-bar-class';
import {
  couplerPoint,
  couplerPointMotion,
  fourBarMotion,
} from '@/lib/kinematics/linkage/four-bar-motion';
import {
  rockerStrokes,
  transmissionAngle,
  transmissionExtremes,
} from '@/lib/kinematics/linkage/four-bar-strokes';
import { fourBarThroughPairs } from '@/lib/kinematics/linkage/freudenstein';
import { degree, expectOutcome, number, numberOr } from '../inputs';
import type { Family, Inputs } from '../inputs';

export const fourBarAnswers: Family = {
  fourbar_position: (inputs) => {
    const found = expectOutcome(fourBarPosition(bars(inputs), theta(inputs)), 'closes');
    return {
      theta3_open_deg: found.open.couplerAngle / degree,
      theta4_open_deg: found.open.rockerAngle / degree,
      theta3_crossed_deg: found.crossed.couplerAngle / degree,
      theta4_crossed_deg: found.crossed.rockerAngle / degree,
    };
  },
  fourbar_assembly: (inputs) => {
    const found = fourBarAssembly(bars(inputs), theta(inputs));
    return {
      assembles_bool: found.outcome === 'closes',
      diagonal_mm: found.diagonal,
      gap_mm: found.outcome === 'closes' ? 0 : found.by,
    };
  },
  fourbar_velocity_acceleration: (inputs) => {
    const crank = {
      angle: theta(inputs),
      speed: number(inputs, 'omega2_rad_s'),
      acceleration: numberOr(inputs, 'alpha2_rad_s2', 0),
    };
    const open = expectOutcome(fourBarMotion(bars(inputs), 'open', crank), 'moves');
    const crossed = expectOutcome(fourBarMotion(bars(inputs), 'crossed', crank), 'moves');
    return {
      omega3_open_rad_s: open.couplerSpeed,
      omega4_open_rad_s: open.rockerSpeed,
      alpha3_open_rad_s2: open.couplerAcceleration,
      alpha4_open_rad_s2: open.rockerAcceleration,
      omega3_crossed_rad_s: crossed.couplerSpeed,
      omega4_crossed_rad_s: crossed.rockerSpeed,
      alpha3_crossed_rad_s2: crossed.couplerAcceleration,
      alpha4_crossed_rad_s2: crossed.rockerAcceleration,
    };
  },
  fourbar_transmission: (inputs) => {
    const now = expectOutcome(transmissionAngle(bars(inputs), theta(inputs)), 'closes');
    const extremes = expectOutcome(transmissionExtremes(bars(inputs)), 'extremes');
    return {
      mu_deg: now.angle / degree,
      mu_min_deg: extremes.least / degree,
      mu_max_deg: extremes.most / degree,
      mu_worst_acute_deg: extremes.worst / degree,
    };
  },
  fourbar_grashof: (inputs) => {
    const count = grashofCount(bars(inputs));
    return {
      shortest_plus_longest_mm: count.shortestPlusLongest,
      other_two_mm: count.otherTwo,
      class_string: count.class,
      input_full_rotation_bool: count.crankTurns,
      output_full_rotation_bool: count.rockerTurns,
    };
  },
  fourbar_input_limits: (inputs) => {
    const found = expectOutcome(crankLimits(bars(inputs)), 'limits');
    return {
      ...(found.most === undefined ? {} : { theta2_max_deg: found.most / degree }),
      ...(found.least === undefined ? {} : { theta2_min_deg: found.least / degree }),
    };
  },
  crank_rocker_limits: (inputs) => {
    const found = expectOutcome(rockerStrokes(bars(inputs)), 'swings');
    return {
      theta4_extended_deg: found.rockerExtended / degree,
      theta4_folded_deg: found.rockerFolded / degree,
      swing_deg: found.swing / degree,
      theta2_extended_deg: found.crankExtended / degree,
      theta2_folded_deg: found.crankFolded / degree,
      imbalance_deg: found.imbalance / degree,
      time_ratio: found.timeRatio,
    };
  },
  coupler_point: (inputs) => {
    const found = expectOutcome(couplerPoint(bars(inputs), place(inputs), theta(inputs)), 'closes');
    return { px_mm: found.open.x, py_mm: found.open.y };
  },
  coupler_point_velocity: (inputs) => {
    const crank = { angle: theta(inputs), speed: number(inputs, 'omega2_rad_s') };
    const found = expectOutcome(
      couplerPointMotion(bars(inputs), 'open', place(inputs), crank),
      'moves',
    );
    return {
      vx_mm_s: found.velocity.x,
      vy_mm_s: found.velocity.y,
      speed_mm_s: found.speed,
    };
  },
  freudenstein_synthesis: (inputs) => {
    const pair = (k: number) => ({
      crank: number(inputs, `theta2_${k}_deg`) * degree,
      rocker: number(inputs, `theta4_${k}_deg`) * degree,
    });
    const found = expectOutcome(
      fourBarThroughPairs(number(inputs, 'd_mm'), [pair(1), pair(2), pair(3)]),
      'bars',
    );
    return { a_mm: found.bars.crank, b_mm: found.bars.coupler, c_mm: found.bars.rocker };
  },
  cognates: (inputs) => {
    const { thirdPin, left, right } = cognates(bars(inputs), place(inputs));
    return {
      ocx_mm: thirdPin.x,
      ocy_mm: thirdPin.y,
      ...named('left', left.bars),
      ...named('right', right.bars),
    };
  },
};

function bars(inputs: Inputs): FourBarLengths {
  return {
    crank: number(inputs, 'a_mm'),
    coupler: number(inputs, 'b_mm'),
    rocker: number(inputs, 'c_mm'),
    frame: number(inputs, 'd_mm'),
  };
}

function theta(inputs: Inputs): number {
  return number(inputs, 'theta2_deg') * degree;
}

function place(inputs: Inputs) {
  return { distance: number(inputs, 'ap_mm'), angle: number(inputs, 'delta_deg') * degree };
}

function named(side: string, { crank, coupler, rocker, frame }: FourBarLengths) {
  return {
    [`${side}_crank_mm`]: crank,
    [`${side}_coupler_mm`]: coupler,
    [`${side}_rocker_mm`]: rocker,
    [`${side}_ground_mm`]: frame,
  };
}
