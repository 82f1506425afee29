import { genevaLayout, genevaState } from '@/lib/kinematics/intermittent/geneva';
import { ratchet, ratchetStroke } from '@/lib/kinematics/intermittent/ratchet';
import { type Family, degree, number } from '../inputs';

export const intermittentAnswers: Family = {
  geneva_external: (inputs) => {
    const slots = number(inputs, 'slots_count');
    const layout = genevaLayout('outside', slots, number(inputs, 'crank_mm'));
    return {
      centre_distance_mm: layout.centreDistance,
      wheel_radius_mm: layout.mouthRadius,
      motion_angle_deg: layout.motionAngle / degree,
      dwell_angle_deg: layout.dwellAngle / degree,
      motion_fraction: layout.motionFraction,
      peak_speed_ratio: layout.peakSpeedRatio,
      entry_acceleration: layout.entryAcceleration,
      peak_acceleration: layout.peakAcceleration,
      angle_at_peak_deg: layout.angleAtPeak / degree,
    };
  },

  geneva_position: (inputs) => {
    const angle = number(inputs, 'driver_angle_deg') * degree;
    const state = genevaState('outside', number(inputs, 'slots_count'), angle);
    return {
      wheel_angle_deg: state.wheelAngle / degree,
      speed_ratio: state.speedRatio,
      acceleration: state.acceleration,
    };
  },

  geneva_internal: (inputs) => {
    const slots = number(inputs, 'slots_count');
    const layout = genevaLayout('inside', slots, number(inputs, 'crank_mm'));
    return {
      centre_distance_mm: layout.centreDistance,
      motion_angle_deg: layout.motionAngle / degree,
      dwell_angle_deg: layout.dwellAngle / degree,
      peak_speed_ratio: layout.peakSpeedRatio,
      entry_acceleration: layout.entryAcceleration,
    };
  },

  ratchet: (inputs) => {
    const teeth = number(inputs, 'teeth_count');
    const { pitch, resolution } = ratchet(teeth, number(inputs, 'pawls_count'));
    const stroke = ratchetStroke(teeth, number(inputs, 'arm_swing_deg') * degree);
    const moves = stroke.outcome === 'steps';
    return {
      pitch_deg: pitch / degree,
      resolution_deg: resolution / degree,
      teeth_per_swing_count: moves ? stroke.teeth : 0,
      wheel_turn_deg: moves ? stroke.turn / degree : 0,
      max_backlash_deg: resolution / degree,
    };
  },
};
