import {
  crankSliderMotion,
  crankSliderPosition,
  type CrankSlider,
} from '@/lib/kinematics/linkage/crank-slider';
import {
  fastestSlider,
  sliderStroke,
  sliderTravel,
} from '@/lib/kinematics/linkage/crank-slider-stroke';
import { invertedPosition } from '@/lib/kinematics/linkage/inverted-crank-slider';
import {
  shaperStroke,
  shaperStrokes,
  whitworthStrokes,
} from '@/lib/kinematics/linkage/quick-return';
import { yokeMotion, yokeStroke } from '@/lib/kinematics/linkage/scotch-yoke';
import { degree, expectOutcome, number, numberOr } from '../inputs';
import type { Family, Inputs } from '../inputs';

export const sliderAnswers: Family = {
  slider_crank_position: (inputs) => {
    const found = expectOutcome(crankSliderPosition(slider(inputs), theta(inputs)), 'closes');
    return {
      x_right_mm: found.right.slider,
      x_left_mm: found.left.slider,
      rod_angle_right_deg: found.right.rodAngle / degree,
      rod_angle_left_deg: found.left.rodAngle / degree,
    };
  },
  slider_crank_velocity_acceleration: (inputs) => {
    const found = expectOutcome(
      crankSliderMotion(slider(inputs), 'right', {
        angle: theta(inputs),
        speed: number(inputs, 'omega2_rad_s'),
        acceleration: numberOr(inputs, 'alpha2_rad_s2', 0),
      }),
      'moves',
    );
    return {
      v_mm_s: found.velocity,
      a_mm_s2: found.acceleration,
      omega3_rad_s: found.rodSpeed,
      alpha3_rad_s2: found.rodAcceleration,
    };
  },
  slider_crank_stroke: (inputs) => {
    const found = expectOutcome(sliderStroke(slider(inputs)), 'turns-fully');
    return {
      x_max_mm: found.outer,
      x_min_mm: found.inner,
      stroke_mm: found.stroke,
      theta2_outer_deg: found.crankOuter / degree,
      theta2_inner_deg: found.crankInner / degree,
      time_ratio: found.timeRatio,
    };
  },
  piston_displacement: (inputs) => {
    const found = expectOutcome(sliderTravel(slider(inputs), theta(inputs)), 'closes');
    return { travel_mm: found.travel, travel_approx_mm: found.approximate };
  },
  slider_crank_max_speed: (inputs) => {
    const found = expectOutcome(fastestSlider(slider(inputs)), 'found');
    return { theta2_deg: found.crankAngle / degree, v_per_omega_mm: found.speed };
  },
  scotch_yoke: (inputs) => {
    const yoke = { crank: number(inputs, 'a_mm') };
    const speed = number(inputs, 'omega2_rad_s');
    const found = yokeMotion(yoke, { angle: theta(inputs), speed });
    return {
      x_mm: found.position,
      v_mm_s: found.velocity,
      a_mm_s2: found.acceleration,
      stroke_mm: yokeStroke(yoke),
    };
  },
  crank_shaper: (inputs) => {
    const found = expectOutcome(shaperStrokes(lever(inputs)), 'swings');
    return {
      half_swing_deg: found.halfSwing / degree,
      time_ratio: found.timeRatio,
      stroke_mm: shaperStroke(number(inputs, 'lever_mm'), found.halfSwing),
    };
  },
  whitworth: (inputs) => {
    const found = expectOutcome(whitworthStrokes(lever(inputs)), 'turns');
    return { quick_angle_deg: found.quickAngle / degree, time_ratio: found.timeRatio };
  },
  inverted_slider_crank: (inputs) => {
    const found = expectOutcome(
      invertedPosition(
        {
          crank: number(inputs, 'a_mm'),
          frame: number(inputs, 'd_mm'),
          arm: number(inputs, 'c_mm'),
          grooveAngle: numberOr(inputs, 'gamma_deg', 90) * degree,
        },
        theta(inputs),
      ),
      'closes',
    );
    return {
      theta4_left_deg: found.left.armAngle / degree,
      b_left_mm: found.left.reach,
      theta4_right_deg: found.right.armAngle / degree,
      b_right_mm: found.right.reach,
    };
  },
};

function slider(inputs: Inputs): CrankSlider {
  return {
    crank: number(inputs, 'a_mm'),
    rod: number(inputs, 'b_mm'),
    offset: numberOr(inputs, 'offset_mm', 0),
  };
}

function theta(inputs: Inputs): number {
  return number(inputs, 'theta2_deg') * degree;
}

function lever(inputs: Inputs) {
  return {
    crank: number(inputs, 'crank_mm'),
    centreDistance: number(inputs, 'centre_distance_mm'),
  };
}
