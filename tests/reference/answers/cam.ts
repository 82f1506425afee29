import { constantBreadth, constantBreadthPerimeter } from '@/lib/kinematics/cam/constant-breadth';
import { leastFlatBaseRadius, pitchCurvature, sharpestBend } from '@/lib/kinematics/cam/curvature';
import { eccentricLift } from '@/lib/kinematics/cam/eccentric';
import type { MotionLaw } from '@/lib/kinematics/cam/motion-law';
import { peakFactors } from '@/lib/kinematics/cam/peak-factors';
import { greatestPressureAngle, pressureAngle } from '@/lib/kinematics/cam/pressure-angle';
import { type Rise, greatestSlope, riseMotion } from '@/lib/kinematics/cam/rise';
import { heartCam } from '@/lib/kinematics/cam/snail';
import { tangentCamAction, tangentCamMotion } from '@/lib/kinematics/cam/tangent-cam';
import type { TranslatingRoller } from '@/lib/kinematics/cam/translating-roller';
import { type Family, type Inputs, degree, expectOutcome, number, numberOr, text } from '../inputs';

export const camAnswers: Family = {
  cam_peak_factors: (inputs) => {
    const { velocity, acceleration, jerk } = peakFactors(lawOf(inputs));
    return { peak_velocity: velocity, peak_acceleration: acceleration, peak_jerk: jerk };
  },

  cam_peak_factors_asymmetric: (inputs) => {
    const { velocity, accelerationMax, accelerationMin } = peakFactors(lawOf(inputs));
    return {
      peak_velocity: velocity,
      acceleration_max: accelerationMax,
      acceleration_min: accelerationMin,
    };
  },

  cam_motion: (inputs) => {
    const turned = number(inputs, 'theta_deg') * degree;
    const motion = riseMotion(riseOf(inputs), turned, number(inputs, 'omega_rad_s'));
    return {
      s_mm: motion.position,
      v_mm_s: motion.velocity,
      a_mm_s2: motion.acceleration,
      j_mm_s3: motion.jerk,
    };
  },

  cam_pressure_angle: (inputs) => {
    const [rise, follower] = [riseOf(inputs), rollerOf(inputs)];
    const turned = number(inputs, 'theta_deg') * degree;
    const now = expectOutcome(pressureAngle(rise, follower, turned), 'leans');
    const most = expectOutcome(greatestPressureAngle(rise, follower), 'leans');
    return {
      pressure_angle_deg: now.angle / degree,
      pressure_angle_max_deg: most.angle / degree,
      theta_at_max_deg: most.at / degree,
    };
  },

  cam_flat_face: (inputs) => {
    const rise = riseOf(inputs);
    return {
      base_radius_min_mm: leastFlatBaseRadius(rise, number(inputs, 'min_curvature_radius_mm')),
      face_rise_mm: greatestSlope(rise),
    };
  },

  cam_curvature: (inputs) => {
    const [rise, follower] = [riseOf(inputs), rollerOf(inputs)];
    const turned = number(inputs, 'theta_deg') * degree;
    const bend = sharpestBend(rise, follower);
    const known = bend.outcome === 'undercut' ? bend : expectOutcome(bend, 'clean');
    return {
      rho_pitch_mm: expectOutcome(pitchCurvature(rise, follower, turned), 'curves').radius,
      rho_pitch_min_mm: known.pitchRadius,
      cam_surface_rho_min_mm: known.rimRadius,
      undercut_bool: known.outcome === 'undercut',
    };
  },

  eccentric_cam: (inputs) => {
    const lift = eccentricLift(
      {
        discRadius: number(inputs, 'disc_radius_mm'),
        eccentricity: number(inputs, 'eccentricity_mm'),
      },
      number(inputs, 'roller_radius_mm'),
      number(inputs, 'theta_deg') * degree,
    );
    const { roller, flat, full } = expectOutcome(lift, 'lifts');
    return { roller_lift_mm: roller, flat_lift_mm: flat, full_lift_mm: full };
  },

  tangent_cam: (inputs) => {
    const cam = {
      baseRadius: number(inputs, 'base_radius_mm'),
      noseRadius: number(inputs, 'nose_radius_mm'),
      lift: number(inputs, 'lift_mm'),
    };
    const roller = number(inputs, 'roller_radius_mm');
    const action = expectOutcome(tangentCamAction(cam, roller), 'turns');
    const turned = number(inputs, 'theta_deg') * degree;
    const moving = tangentCamMotion(cam, roller, turned, number(inputs, 'omega_rad_s'));
    const { motion } = expectOutcome(moving, 'moves');
    return {
      half_action_deg: action.halfAction / degree,
      flank_end_deg: action.flankEnd / degree,
      s_mm: motion.position,
      v_mm_s: motion.velocity,
    };
  },

  heart_cam: (inputs) => {
    const heart = {
      startRadius: number(inputs, 'start_radius_mm'),
      lift: number(inputs, 'lift_mm'),
    };
    const place = heartCam(heart, number(inputs, 'theta_deg') * degree);
    return {
      radius_mm: place.radius,
      pressure_angle_deg: place.pressureAngle / degree,
      pressure_angle_max_deg: heartCam(heart, 0).pressureAngle / degree,
    };
  },

  constant_breadth_cam: (inputs) => {
    const cam = {
      side: number(inputs, 'triangle_side_mm'),
      cornerRadius: number(inputs, 'corner_radius_mm'),
    };
    const direction = number(inputs, 'jaw_direction_deg') * degree;
    return {
      breadth_mm: constantBreadth(cam, direction),
      perimeter_mm: constantBreadthPerimeter(cam),
    };
  },
};

const laws: Readonly<Record<string, MotionLaw>> = {
  uniform: 'uniform',
  parabolic: 'parabolic',
  shm: 'simple-harmonic',
  simple_harmonic: 'simple-harmonic',
  cycloidal: 'cycloidal',
  poly345: '3-4-5',
  poly4567: '4-5-6-7',
  modified_trapezoid: 'modified-trapezoid',
  modified_sine: 'modified-sine',
  double_harmonic: 'double-harmonic',
};

function lawOf(inputs: Inputs): MotionLaw {
  const name = text(inputs, 'law_string');
  const law = laws[name];
  if (!law) throw new RangeError(`the case names a law that the library does not know: ${name}`);
  return law;
}

function riseOf(inputs: Inputs): Rise {
  return {
    law: lawOf(inputs),
    lift: number(inputs, 'lift_mm'),
    angle: number(inputs, 'beta_deg') * degree,
  };
}

function rollerOf(inputs: Inputs): TranslatingRoller {
  return {
    baseRadius: number(inputs, 'base_radius_mm'),
    rollerRadius: number(inputs, 'roller_radius_mm'),
    offset: numberOr(inputs, 'offset_mm', 0),
  };
}
