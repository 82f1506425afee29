import { bevelCones } from '@/lib/kinematics/gear/bevel';
import { centresChanged, shiftedPair } from '@/lib/kinematics/gear/centres';
import { wheelFromPitch } from '@/lib/kinematics/gear/circular-pitch';
import { contactOf, rackContactRatio, ringContact } from '@/lib/kinematics/gear/contact';
import {
  fewestTeethForPair,
  fewestTeethForRack,
  largestWheel,
  leastShift,
} from '@/lib/kinematics/gear/interference';
import { involute, involuteInverse } from '@/lib/kinematics/gear/involute';
import { lanternPoint, lanternPointedRadius, lanternSizes } from '@/lib/kinematics/gear/lantern';
import {
  betweenPins,
  overPins,
  rackOverPin,
  spanMeasurement,
} from '@/lib/kinematics/gear/measurement';
import { centreDistance, gearPair, pitchLineSpeed } from '@/lib/kinematics/gear/mesh';
import { gearProportions } from '@/lib/kinematics/gear/proportions';
import type { GearSpec } from '@/lib/kinematics/gear/proportions';
import { rackTravel } from '@/lib/kinematics/gear/rack';
import { ringProportions } from '@/lib/kinematics/gear/ring';
import {
  basicRack,
  diametralSizes,
  moduleFromDiametralPitch,
  moduleSeries,
} from '@/lib/kinematics/gear/standards';
import {
  baseThickness,
  chordalTooth,
  pointedRadius,
  toothThickness,
} from '@/lib/kinematics/gear/thickness';
import { degree, expectOutcome, inch, number, numberOr, numbers, rpm, text } from '../inputs';
import type { Family, Inputs } from '../inputs';

export const gearAnswers: Family = {
  gear_basic: (inputs) => {
    const sizes = gearProportions(wheel(inputs));
    return {
      d_mm: sizes.pitchDiameter,
      db_mm: sizes.baseDiameter,
      da_mm: sizes.tipDiameter,
      df_mm: sizes.rootDiameter,
      p_mm: sizes.pitch,
      pb_mm: sizes.basePitch,
      s_mm: sizes.thickness,
      h_mm: sizes.depth,
    };
  },
  gear_diametral_pitch: (inputs) => {
    const pitch = number(inputs, 'diametral_pitch_per_in');
    const sizes = diametralSizes(pitch, number(inputs, 'teeth_count'));
    return {
      pitch_diameter_in: sizes.pitchDiameter,
      outside_diameter_in: sizes.outsideDiameter,
      circular_pitch_in: sizes.circularPitch,
      tooth_thickness_in: sizes.toothThickness,
      addendum_in: sizes.addendum,
      dedendum_in: sizes.dedendum,
      whole_depth_in: sizes.wholeDepth,
      clearance_in: sizes.clearance,
      module_mm: moduleFromDiametralPitch(pitch),
    };
  },
  module_conversion: (inputs) => {
    const size = number(inputs, 'module_mm');
    const { pitch } = gearProportions({ module: size, teeth: 20, pressureAngle: 20 * degree });
    return {
      diametral_pitch_per_in: moduleFromDiametralPitch(size),
      circular_pitch_mm: pitch,
      circular_pitch_in: pitch / inch,
    };
  },
  gear_from_circular_pitch: (inputs) => {
    const made = wheelFromPitch(number(inputs, 'circular_pitch_mm'), number(inputs, 'teeth_count'));
    return { d_mm: made.pitchDiameter, module_mm: made.module, chord_mm: made.chord };
  },
  iso53_profile: (inputs) => {
    const type = text(inputs, 'type_string');
    if (type !== 'A' && type !== 'B' && type !== 'C' && type !== 'D') throw new RangeError(type);
    const rack = basicRack(number(inputs, 'module_mm'), type);
    return {
      hap_mm: rack.addendum,
      cp_mm: rack.clearance,
      hfp_mm: rack.dedendum,
      rho_fp_mm: rack.filletRadius,
      alpha_deg: rack.pressureAngle / degree,
    };
  },
  iso54_series: (inputs) => ({ series_list: numbers(inputs, 'modules_mm').map(moduleSeries) }),
  involute_function: (inputs) => ({ inv_rad: involute(number(inputs, 'angle_deg') * degree) }),
  involute_inverse: (inputs) => ({
    angle_deg: involuteInverse(number(inputs, 'inv_rad')) / degree,
  }),
  tooth_thickness: (inputs) => ({
    s_r_mm: expectOutcome(toothThickness(wheel(inputs), number(inputs, 'radius_mm')), 'tooth')
      .thickness,
    s_base_mm: baseThickness(wheel(inputs)),
    pointed_radius_mm: pointedRadius(wheel(inputs)),
  }),
  chordal_thickness: (inputs) => {
    const { thickness, addendum } = chordalTooth(wheel(inputs));
    return { chordal_thickness_mm: thickness, chordal_addendum_mm: addendum };
  },
  contact_ratio: (inputs) => {
    const distance = centreDistance(mesh(inputs)) + numberOr(inputs, 'centre_extension_mm', 0);
    const contact = expectOutcome(contactOf(pair(inputs), distance), 'contact');
    return {
      centre_distance_mm: distance,
      operating_pressure_angle_deg: contact.operatingAngle / degree,
      path_mm: contact.path,
      contact_ratio: contact.contactRatio,
    };
  },
  contact_ratio_rack: (inputs) => ({
    contact_ratio: rackContactRatio(wheel(inputs)),
    travel_per_turn_mm: rackTravel(wheel(inputs), 360 * degree),
  }),
  internal_gear: (inputs) => {
    const ring = ringProportions({
      ...wheel({ ...inputs, teeth_count: inputs['teeth2_count'] }),
    });
    return {
      ring_tip_diameter_mm: ring.tipDiameter,
      ring_root_diameter_mm: ring.rootDiameter,
      centre_distance_mm: centreDistance({ ...mesh(inputs), ring: 'second' }),
      contact_ratio: expectOutcome(ringContact(pair(inputs)), 'contact').contactRatio,
    };
  },
  centre_distance_change: (inputs) => {
    const outcome = centresChanged(pair(inputs), number(inputs, 'centre_distance_mm'));
    const runs = expectOutcome(outcome, 'runs');
    return {
      operating_pressure_angle_deg: runs.operatingAngle / degree,
      dw1_mm: runs.firstRolling,
      dw2_mm: runs.secondRolling,
      backlash_mm: runs.backlash,
      backlash_estimate_mm: runs.backlashEstimate,
    };
  },
  min_teeth_rack: (inputs) => {
    const { exact, teeth } = fewestTeethForRack(tooth(inputs));
    return { teeth_exact: exact, teeth_min_count: teeth };
  },
  min_pinion_pair: (inputs) => {
    const { exact, teeth } = fewestTeethForPair(tooth(inputs), number(inputs, 'ratio'));
    return { teeth_exact: exact, teeth_min_count: teeth };
  },
  largest_gear: (inputs) => {
    const outcome = largestWheel(tooth(inputs), number(inputs, 'pinion_teeth_count'));
    if (outcome.outcome === 'any') {
      return { gear_teeth_exact: 'infinite', gear_teeth_max_count: 'infinite' };
    }
    const { exact, teeth } = expectOutcome(outcome, 'largest');
    return { gear_teeth_exact: exact, gear_teeth_max_count: teeth };
  },
  min_shift: (inputs) => ({ x_min: leastShift(tooth(inputs), number(inputs, 'teeth_count')) }),
  profile_shift_pair: (inputs) => {
    const made = expectOutcome(shiftedPair(pair(inputs)), 'pair');
    return {
      operating_pressure_angle_deg: made.operatingAngle / degree,
      y: made.widening,
      centre_distance_mm: made.centreDistance,
      da1_mm: made.firstTip,
      da2_mm: made.secondTip,
      df1_mm: made.firstRoot,
      df2_mm: made.secondRoot,
    };
  },
  span_measurement: (inputs) => ({
    span_mm: spanMeasurement(wheel(inputs), number(inputs, 'span_teeth_count')).span,
  }),
  over_pins: (inputs) => {
    const outcome = overPins(wheel(inputs), number(inputs, 'pin_mm'));
    const { reading, pinCircle } = expectOutcome(outcome, 'reading');
    return { measurement_mm: reading, pin_centre_circle_mm: pinCircle };
  },
  between_pins_internal: (inputs) => {
    const outcome = betweenPins(wheel(inputs), number(inputs, 'pin_mm'));
    const { reading, pinCircle } = expectOutcome(outcome, 'reading');
    return { measurement_mm: reading, pin_centre_circle_mm: pinCircle };
  },
  rack_over_pin: (inputs) => ({
    height_mm: rackOverPin(
      {
        module: number(inputs, 'module_mm'),
        pressureAngle: number(inputs, 'pressure_angle_deg') * degree,
      },
      number(inputs, 'pin_mm'),
    ),
  }),
  bevel_pitch_angles: (inputs) => {
    const { first, second } = bevelCones({
      firstTeeth: number(inputs, 'teeth1_count'),
      secondTeeth: number(inputs, 'teeth2_count'),
      shaftAngle: number(inputs, 'shaft_angle_deg') * degree,
    });
    return { cone1_deg: first / degree, cone2_deg: second / degree };
  },
  lantern_gear: (inputs) => {
    const spec = {
      pitch: number(inputs, 'circular_pitch_mm'),
      wheelTeeth: number(inputs, 'wheel_teeth_count'),
      pins: number(inputs, 'pins_count'),
      pinDiameter: number(inputs, 'pin_diameter_mm'),
    };
    const sizes = lanternSizes(spec);
    const { pinCentre, flank } = lanternPoint(spec, number(inputs, 'roll_deg') * degree);
    return {
      wheel_pitch_radius_mm: sizes.wheelRadius,
      lantern_pin_circle_radius_mm: sizes.pinCircleRadius,
      centre_distance_mm: sizes.centreDistance,
      pin_centre_x_mm: pinCentre.x,
      pin_centre_y_mm: pinCentre.y,
      flank_x_mm: flank.x,
      flank_y_mm: flank.y,
      pointed_tip_radius_mm: lanternPointedRadius(spec),
    };
  },
  gear_pair: (inputs) => {
    const { centreDistance: distance, turns, torqueRatio } = gearPair(mesh(inputs));
    const input = number(inputs, 'input_rpm');
    const driver = { module: number(inputs, 'module_mm'), teeth: number(inputs, 'teeth1_count') };
    return {
      centre_distance_mm: distance,
      output_rpm: input * turns,
      torque_ratio: torqueRatio,
      pitch_line_speed_m_s: pitchLineSpeed(driver, input * rpm) / 1000,
    };
  },
};

function wheel(inputs: Inputs): GearSpec {
  return {
    module: number(inputs, 'module_mm'),
    teeth: number(inputs, 'teeth_count'),
    pressureAngle: number(inputs, 'pressure_angle_deg') * degree,
    shift: numberOr(inputs, 'shift_x', 0),
    addendum: numberOr(inputs, 'addendum_factor', 1),
    clearance: numberOr(inputs, 'clearance_factor', 0.25),
  };
}

function mesh(inputs: Inputs) {
  return {
    module: number(inputs, 'module_mm'),
    firstTeeth: number(inputs, 'teeth1_count'),
    secondTeeth: number(inputs, 'teeth2_count'),
  };
}

function pair(inputs: Inputs) {
  return {
    ...mesh(inputs),
    pressureAngle: number(inputs, 'pressure_angle_deg') * degree,
    firstShift: numberOr(inputs, 'shift1_x', 0),
    secondShift: numberOr(inputs, 'shift2_x', 0),
  };
}

function tooth(inputs: Inputs) {
  return {
    pressureAngle: number(inputs, 'pressure_angle_deg') * degree,
    addendum: numberOr(inputs, 'addendum_factor', 1),
  };
}
