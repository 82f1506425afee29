import { doubleHookeExtremes } from '@/lib/kinematics/coupling/double-hooke';
import {
  hookeBendFor,
  hookeExtremes,
  hookeGreatestAcceleration,
  hookeJoint,
} from '@/lib/kinematics/coupling/hooke';
import { oldhamMotion } from '@/lib/kinematics/coupling/oldham';
import { type Family, degree, number, rpm } from '../inputs';

export const couplingAnswers: Family = {
  hooke_joint: (inputs) => {
    const bend = number(inputs, 'shaft_angle_deg') * degree;
    const turns = number(inputs, 'input_rpm');
    const now = hookeJoint(bend, number(inputs, 'theta1_deg') * degree);
    const { fastest, slowest, fluctuation } = hookeExtremes(bend);
    return {
      theta2_deg: now.angle / degree,
      speed_rpm: now.speedRatio * turns,
      alpha2_rad_s2: now.acceleration * (turns * rpm) ** 2,
      max_rpm: fastest * turns,
      min_rpm: slowest * turns,
      fluctuation,
    };
  },

  hooke_max_acceleration: (inputs) => {
    const most = hookeGreatestAcceleration(number(inputs, 'shaft_angle_deg') * degree);
    return {
      theta1_deg: most.angle / degree,
      alpha2_max_rad_s2: most.acceleration * (number(inputs, 'input_rpm') * rpm) ** 2,
      theta1_approx_deg: most.usualAngle / degree,
    };
  },

  hooke_angle_for_fluctuation: (inputs) => ({
    shaft_angle_deg: hookeBendFor(number(inputs, 'fluctuation')) / degree,
  }),

  double_hooke: (inputs) => {
    const bend = number(inputs, 'shaft_angle_deg') * degree;
    const turns = number(inputs, 'input_rpm');
    const equal = { firstBend: bend, secondBend: bend };
    const right = doubleHookeExtremes({ ...equal, phase: 0 });
    const wrong = doubleHookeExtremes({ ...equal, phase: Math.PI / 2 });
    return {
      max_right_rpm: right.fastest * turns,
      min_right_rpm: right.slowest * turns,
      max_wrong_rpm: wrong.fastest * turns,
      min_wrong_rpm: wrong.slowest * turns,
    };
  },

  oldham: (inputs) => {
    const speed = number(inputs, 'input_rpm') * rpm;
    const motion = oldhamMotion(number(inputs, 'offset_mm'), speed);
    return {
      output_rpm: motion.drivenSpeed / rpm,
      centre_path_radius_mm: motion.pathRadius,
      centre_path_rpm: motion.pathSpeed / rpm,
      max_sliding_m_s: motion.greatestSlidingSpeed / 1000,
    };
  },
};
