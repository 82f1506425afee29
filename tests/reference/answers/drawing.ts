import {
  ellipseArea,
  ellipseFoci,
  ellipseLocus,
  ellipsePerimeter,
  ellipsePerimeterRamanujan1,
  ellipsePerimeterRamanujan2,
  ellipsePerimeterRootMeanSquare,
} from '@/lib/geometry/ellipse';
import { counterCrank, counterRatios } from '@/lib/kinematics/linkage/antiparallelogram';
import { scissorLift, tongsPose, tongsTravel } from '@/lib/kinematics/linkage/lazy-tongs';
import { planarMobility, spatialMobility, usefulMobility } from '@/lib/kinematics/linkage/mobility';
import { knownCorrection } from '@/lib/kinematics/linkage/paradoxes';
import {
  pantographCopy,
  pantographDisplacement,
  type PantographCorner,
} from '@/lib/kinematics/linkage/pantograph';
import { pantographHoles, truePantograph } from '@/lib/kinematics/linkage/pantograph-making';
import { boardPoint } from '@/lib/kinematics/linkage/parallelogram';
import { plagiographCopy, plagiographPose } from '@/lib/kinematics/linkage/plagiograph';
import { togglePress } from '@/lib/kinematics/linkage/toggle';
import { trammelForOval, trammelOval, trammelPose } from '@/lib/kinematics/linkage/trammel';
import {
  barTrammel,
  cardanDiameter,
  halfAxes,
  pinsApart,
} from '@/lib/kinematics/linkage/trammel-making';
import { degree, expectOutcome, number, numberOr, text } from '../inputs';
import type { Family, Inputs } from '../inputs';

export const drawingAnswers: Family = {
  trammel_on_bar: (inputs) => {
    const { trammel, angle } = barTrammel({
      spacing: number(inputs, 'ab_mm'),
      beyond: number(inputs, 'bp_mm'),
      lean: number(inputs, 'theta_deg') * degree,
    });
    const { pen } = trammelPose(trammel, angle);
    const axes = halfAxes(trammel);
    const foci = ellipseFoci(trammelOval(trammel));
    return {
      px_mm: pen.x,
      py_mm: pen.y,
      semi_x_mm: axes.x,
      semi_y_mm: axes.y,
      locus_value: ellipseLocus(axes.x, axes.y, pen),
      focus_mm: foci.focalDistance,
      eccentricity: foci.eccentricity,
    };
  },
  trammel_off_bar: (inputs) => {
    const { trammel, angle } = barTrammel({
      spacing: number(inputs, 'ab_mm'),
      fromMiddle: number(inputs, 'u_mm'),
      beside: number(inputs, 'v_mm'),
      lean: number(inputs, 'theta_deg') * degree,
    });
    const { pen } = trammelPose(trammel, angle);
    const oval = trammelOval(trammel);
    return {
      px_mm: pen.x,
      py_mm: pen.y,
      semi_major_mm: oval.semiMajor,
      semi_minor_mm: oval.semiMinor,
      major_axis_deg: oval.majorAxis / degree,
    };
  },
  trammel_skew_slots: (inputs) => {
    const { trammel } = barTrammel({
      spacing: number(inputs, 'ab_mm'),
      fromMiddle: 0,
      grooveAngle: number(inputs, 'slot_angle_deg') * degree,
    });
    const oval = trammelOval(trammel);
    return {
      semi_major_mm: oval.semiMajor,
      semi_minor_mm: oval.semiMinor,
      cardan_diameter_mm: cardanDiameter(trammel),
    };
  },
  ellipse_from_size: (inputs) => {
    const trammel = trammelForOval(
      number(inputs, 'overall_length_mm'),
      number(inputs, 'overall_width_mm'),
    );
    const oval = trammelOval(trammel);
    const foci = ellipseFoci(oval);
    return {
      pencil_to_far_slider_mm: trammel.uprightPin,
      pencil_to_near_slider_mm: trammel.levelPin,
      slider_spacing_mm: pinsApart(trammel),
      area_mm2: ellipseArea(oval),
      perimeter_mm: ellipsePerimeter(oval),
      perimeter_ramanujan2_mm: ellipsePerimeterRamanujan2(oval),
      perimeter_rms_mm: ellipsePerimeterRootMeanSquare(oval),
      focus_mm: foci.focalDistance,
      string_loop_mm: foci.stringLoop,
    };
  },
  ellipse_perimeter: (inputs) => {
    const oval = {
      semiMajor: number(inputs, 'semi_major_mm'),
      semiMinor: number(inputs, 'semi_minor_mm'),
    };
    return {
      perimeter_mm: ellipsePerimeter(oval),
      perimeter_ramanujan1_mm: ellipsePerimeterRamanujan1(oval),
      perimeter_ramanujan2_mm: ellipsePerimeterRamanujan2(oval),
    };
  },
  pantograph_scale: (inputs) => {
    const pantograph = pantographFrom(inputs);
    const copy = pantographCopy(pantograph, {
      fixed: corner(inputs, 'fixed_string'),
      stylus: corner(inputs, 'tracer_string'),
      pen: corner(inputs, 'pen_string'),
    });
    return {
      bm_mm: pantograph.secondHole,
      cd_mm: pantograph.secondHole,
      scale: expectOutcome(copy, 'true').scale,
    };
  },
  pantograph_holes: (inputs) => {
    const bar = number(inputs, 'bar_mm');
    const scale = number(inputs, 'scale');
    const { firstHole, otherBar } = expectOutcome(
      pantographHoles(bar, bar, scale, 'middle-to-end'),
      'holes',
    );
    const pantograph = truePantograph(bar, bar, firstHole);
    const reduced = expectOutcome(pantographCopy(pantograph, 'end-to-middle'), 'true');
    return { ob_mm: firstHole, bc_mm: otherBar, reduction_scale: reduced.scale };
  },
  pantograph_displacement: (inputs) => {
    const { M, P } = pantographDisplacement(
      pantographFrom(inputs),
      {
        first: number(inputs, 'oc_angle_deg') * degree,
        second: number(inputs, 'cp_angle_deg') * degree,
      },
      {
        first: number(inputs, 'oc_turn_deg') * degree,
        second: number(inputs, 'cp_turn_deg') * degree,
      },
    );
    return { m_dx_mm: M.x, m_dy_mm: M.y, p_dx_mm: P.x, p_dy_mm: P.y };
  },
  plagiograph: (inputs) => {
    const plagiograph = {
      first: number(inputs, 'oa_mm'),
      second: number(inputs, 'oc_mm'),
      stylusArm: number(inputs, 'ap_mm'),
      plateAngle: number(inputs, 'phi_deg') * degree,
    };
    const copy = plagiographCopy(plagiograph);
    const { stylus, pen } = plagiographPose(
      plagiograph,
      number(inputs, 'oa_angle_deg') * degree,
      number(inputs, 'oc_angle_deg') * degree,
    );
    return {
      px_mm: stylus.x,
      py_mm: stylus.y,
      qx_mm: pen.x,
      qy_mm: pen.y,
      scale: copy.scale,
      turn_deg: copy.turn / degree,
      cq_mm: copy.penArm,
    };
  },
  parallelogram_point: (inputs) => {
    const found = boardPoint(arms(inputs), number(inputs, 'theta_deg') * degree, {
      along: number(inputs, 'ap_mm'),
      above: number(inputs, 'v_mm'),
    });
    return {
      px_mm: found.position.x,
      py_mm: found.position.y,
      path_radius_mm: found.radius,
      coupler_turn_deg: found.turn / degree,
    };
  },
  antiparallelogram: (inputs) => {
    const linkage = { crank: number(inputs, 'crank_mm'), ground: number(inputs, 'ground_mm') };
    const now = expectOutcome(counterCrank(linkage, number(inputs, 'theta2_deg') * degree), 'runs');
    const ends = expectOutcome(counterRatios(linkage), 'runs');
    return {
      theta4_deg: now.angle / degree,
      speed_ratio: now.ratio,
      speed_ratio_near: ends.near,
      speed_ratio_far: ends.far,
    };
  },
  lazy_tongs: (inputs) => {
    const from = number(inputs, 'angle1_deg') * degree;
    const to = number(inputs, 'angle2_deg') * degree;
    const [first, second] = [tongsPose(tongs(inputs), from), tongsPose(tongs(inputs), to)];
    const travelled = tongsTravel(tongs(inputs), from, to);
    return {
      length1_mm: first.length,
      width1_mm: first.width,
      length2_mm: second.length,
      width2_mm: second.width,
      travel_mm: travelled.travel,
      travel_ratio: travelled.timesFirstPair,
    };
  },
  scissor_lift_force: (inputs) => {
    const angle = number(inputs, 'angle_deg') * degree;
    const lift = scissorLift(tongs(inputs), angle, number(inputs, 'load_N'));
    return { height_mm: lift.height, force_N: lift.force };
  },
  toggle_force: (inputs) => {
    const found = togglePress(
      number(inputs, 'alpha_deg') * degree,
      number(inputs, 'beta_deg') * degree,
    );
    return { force_ratio: expectOutcome(found, 'presses').ratio };
  },
  mobility: (inputs) => {
    const links = number(inputs, 'links_incl_ground_count');
    const count =
      text(inputs, 'space_string') === 'spatial'
        ? spatialMobility({
            links,
            oneFreedom: numberOr(inputs, 'joints_1dof_count', 0),
            twoFreedoms: numberOr(inputs, 'joints_2dof_count', 0),
            threeFreedoms: numberOr(inputs, 'joints_3dof_count', 0),
          })
        : planarMobility({
            links,
            fullJoints: numberOr(inputs, 'full_joints_count', 0),
            halfJoints: numberOr(inputs, 'half_joints_count', 0),
          });
    const correction = knownCorrection(text(inputs, 'mechanism_string'));
    return { mobility_count: count, useful_mobility_count: usefulMobility(count, correction) };
  },
};

function corner(inputs: Inputs, key: string): PantographCorner {
  const name = text(inputs, key);
  if (name === 'O' || name === 'M' || name === 'P') return name;
  throw new TypeError(`${key} is ${name}, which is no corner`);
}

/** The closed parallelogram: the second hole takes the same share of its bar. */
function pantographFrom(inputs: Inputs) {
  return truePantograph(number(inputs, 'oc_mm'), number(inputs, 'cp_mm'), number(inputs, 'ob_mm'));
}

function arms(inputs: Inputs) {
  return { arm: number(inputs, 'crank_mm'), ground: number(inputs, 'ground_mm') };
}

function tongs(inputs: Inputs) {
  return { stages: number(inputs, 'stages_count'), bar: number(inputs, 'bar_mm') };
}
