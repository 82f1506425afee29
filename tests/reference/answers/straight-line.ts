import { hartPower } from '@/lib/kinematics/linkage/hart';
import {
  inversionPower,
  peaucellierPath,
  peaucellierPoint,
} from '@/lib/kinematics/linkage/peaucellier';
import { scottRussellBeyond, scottRussellPoint } from '@/lib/kinematics/linkage/scott-russell';
import {
  chebyshev,
  chebyshevLevel,
  hoeken,
  hoekenStraightness,
  pointOf,
  roberts,
  robertsLevel,
} from '@/lib/kinematics/linkage/straight-four-bars';
import { wattPencil, wattPoint, wattStraightness } from '@/lib/kinematics/linkage/watt';
import { degree, expectOutcome, number } from '../inputs';
import type { Family, Inputs } from '../inputs';

export const straightLineAnswers: Family = {
  peaucellier: (inputs) => {
    const path = expectOutcome(peaucellierPath(cell(inputs)), 'line');
    const angle = number(inputs, 'theta_deg') * degree;
    const { far } = expectOutcome(peaucellierPoint(cell(inputs), angle), 'closes');
    return {
      power_mm2: inversionPower(cell(inputs)),
      line_x_mm: path.x,
      py_mm: far.y,
      theta_limit_deg: path.crankLimit / degree,
    };
  },
  peaucellier_arc: (inputs) => {
    const path = expectOutcome(peaucellierPath(cell(inputs)), 'arc');
    return { circle_radius_mm: path.radius, circle_centre_x_mm: path.centre };
  },
  hart_inversor: (inputs) => ({
    power_mm2: hartPower({
      long: number(inputs, 'long_mm'),
      short: number(inputs, 'short_mm'),
      share: number(inputs, 'mu'),
    }),
  }),
  watt_linkage: (inputs) => {
    const angle = number(inputs, 'theta1_deg') * degree;
    const { pencil } = expectOutcome(wattPoint(watt(inputs), angle), 'closes');
    return { ap_mm: wattPencil(watt(inputs)), px_mm: pencil.x, py_mm: pencil.y };
  },
  watt_straightness: (inputs) => {
    const range = number(inputs, 'arm_range_deg') * degree;
    const found = wattStraightness(watt(inputs), range);
    return { travel_mm: found?.stroke, x_min_mm: found?.least, x_max_mm: found?.most };
  },
  chebyshev_linkage: (inputs) => {
    const at = pointOf(chebyshev(arms(inputs)), number(inputs, 'theta2_deg') * degree);
    const level = chebyshevLevel(arms(inputs));
    return {
      px_mm: at?.x,
      py_mm: at?.y,
      height_mid_mm: level?.middle,
      height_min_mm: level?.least,
      height_max_mm: level?.most,
      straightness_pp_over_stroke: level?.share,
    };
  },
  roberts_linkage: (inputs) => {
    const at = pointOf(roberts(arms(inputs)), number(inputs, 'theta2_deg') * degree);
    const armMiddle = robertsLevel(arms(inputs))?.armMiddle;
    return {
      px_mm: at?.x,
      py_mm: at?.y,
      theta2_mid_deg: armMiddle === undefined ? undefined : armMiddle / degree,
    };
  },
  roberts_straightness: (inputs) => {
    const level = robertsLevel(arms(inputs));
    return {
      theta2_at_pivot_deg: level === undefined ? undefined : level.armAtPin / degree,
      y_min_mm: level?.least,
      y_max_mm: level?.most,
    };
  },
  hoeken_linkage: (inputs) => {
    const crank = number(inputs, 'crank_mm');
    const linkage = hoeken({
      crank,
      ground: crank * number(inputs, 'ground_over_crank'),
      coupler: crank * number(inputs, 'coupler_over_crank'),
    });
    const found = hoekenStraightness(linkage, number(inputs, 'crank_range_deg') * degree);
    return {
      dx_over_crank: found && found.stroke / crank,
      straightness_pct: found && found.share * 100,
    };
  },
  lambda_linkage: (inputs) => {
    const linkage = hoeken({
      crank: number(inputs, 'crank_mm'),
      ground: number(inputs, 'ground_mm'),
      coupler: number(inputs, 'coupler_mm'),
      rocker: number(inputs, 'rocker_mm'),
      beyond: number(inputs, 'bp_mm'),
    });
    const at = pointOf(linkage, number(inputs, 'theta2_deg') * degree);
    return { px_mm: at?.x, py_mm: at?.y };
  },
  scott_russell: (inputs) => {
    const linkage = { crank: number(inputs, 'ab_mm'), rod: number(inputs, 'bc_mm') };
    const angle = number(inputs, 'theta_deg') * degree;
    const { pencil } = expectOutcome(scottRussellPoint(linkage, angle), 'closes');
    return { bd_mm: scottRussellBeyond(linkage), dx_mm: pencil.x, dy_mm: pencil.y };
  },
};

function cell(inputs: Inputs) {
  return {
    long: number(inputs, 'long_mm'),
    short: number(inputs, 'short_mm'),
    crank: number(inputs, 'crank_mm'),
    centreDistance: number(inputs, 'centre_distance_mm'),
  };
}

function watt(inputs: Inputs) {
  return {
    arm1: number(inputs, 'arm1_mm'),
    arm2: number(inputs, 'arm2_mm'),
    link: number(inputs, 'link_mm'),
  };
}

function arms(inputs: Inputs) {
  return {
    ground: number(inputs, 'ground_mm'),
    arm: number(inputs, 'arm_mm'),
    link: number(inputs, 'link_mm'),
  };
}
