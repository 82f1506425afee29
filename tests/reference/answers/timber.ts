import { arcFromChord } from '@/lib/kinematics/timber/arc';
import { dividerSetting, teethOnCircle } from '@/lib/kinematics/timber/circle-division';
import { isoFit } from '@/lib/kinematics/timber/fit';
import { millimetresFromInches, nearestInchFraction } from '@/lib/kinematics/timber/inch-fraction';
import { kerfBend, kerfBendRadius, kerfSizes, piecesFromBoard } from '@/lib/kinematics/timber/kerf';
import { woodMovement, woodMovementByShrinkage } from '@/lib/kinematics/timber/movement';
import { segmentedRing } from '@/lib/kinematics/timber/segmented-ring';
import { type Family, degree, expectOutcome, number, text } from '../inputs';

export const timberAnswers: Family = {
  kerf_pieces: (inputs) => {
    const board = number(inputs, 'board_mm');
    const cut = piecesFromBoard(board, number(inputs, 'piece_mm'), number(inputs, 'kerf_mm'));
    return cut.outcome === 'cut'
      ? { pieces_count: cut.pieces, left_mm: cut.left }
      : { pieces_count: 0, left_mm: board };
  },

  laser_kerf: (inputs) => {
    const outline = number(inputs, 'outline_mm');
    const sizes = kerfSizes(outline, number(inputs, 'hole_mm'), number(inputs, 'kerf_mm'));
    return {
      part_mm: sizes.part,
      hole_finished_mm: sizes.hole,
      outline_drawn_mm: sizes.drawnOutline,
      hole_drawn_mm: sizes.drawnHole,
      play_mm: sizes.play,
    };
  },

  kerf_bend: (inputs) => {
    const board = {
      thickness: number(inputs, 'thickness_mm'),
      skin: number(inputs, 'skin_mm'),
      kerf: number(inputs, 'kerf_mm'),
    };
    const bend = kerfBend(board, number(inputs, 'bend_deg') * degree);
    return {
      turn_per_kerf_deg: bend.turnPerKerf / degree,
      kerfs_exact: bend.exactKerfs,
      skin_radius_mm: kerfBendRadius(board, number(inputs, 'spacing_mm')),
    };
  },

  teeth_on_circle: (inputs) => {
    const found = teethOnCircle(number(inputs, 'diameter_mm'), number(inputs, 'pitch_mm'));
    const fits = expectOutcome(found, 'fits');
    return {
      teeth_count: fits.teeth,
      pitch_real_mm: fits.pitch,
      chord_mm: fits.dividerSetting,
      diameter_next_mm: fits.nextDiameter,
    };
  },

  inch_fraction: (inputs) => ({
    value_mm: millimetresFromInches({
      negative: false,
      whole: number(inputs, 'whole_in'),
      numerator: number(inputs, 'numerator_count'),
      denominator: number(inputs, 'denominator_count'),
    }),
  }),

  mm_to_fraction: (inputs) => {
    const finest = number(inputs, 'denominator_max_count');
    const nearest = nearestInchFraction(number(inputs, 'value_mm'), finest);
    return {
      whole_in: nearest.whole,
      numerator_count: nearest.numerator,
      denominator_count: nearest.denominator,
      error_mm: nearest.error,
    };
  },

  wood_movement: (inputs) => {
    const change = (key: string) =>
      woodMovement(
        number(inputs, 'width_mm'),
        number(inputs, key),
        number(inputs, 'mc_initial_pct'),
        number(inputs, 'mc_final_pct'),
      );
    return {
      change_tangential_mm: change('coefficient_tangential'),
      change_radial_mm: change('coefficient_radial'),
    };
  },

  wood_movement_by_shrinkage: (inputs) => {
    const width = number(inputs, 'width_mm');
    const [from, to] = [number(inputs, 'mc_initial_pct'), number(inputs, 'mc_final_pct')];
    const wood = {
      total: number(inputs, 'shrinkage_total_pct'),
      fibreSaturation: number(inputs, 'fibre_saturation_pct'),
    };
    return {
      change_coefficient_mm: woodMovement(width, number(inputs, 'coefficient'), from, to),
      change_shrinkage_mm: woodMovementByShrinkage(width, wood, from, to),
    };
  },

  divide_circle: (inputs) => ({
    chord_mm: dividerSetting(number(inputs, 'diameter_mm'), number(inputs, 'divisions_count')),
  }),

  segmented_ring: (inputs) => {
    const ring = segmentedRing({
      segments: number(inputs, 'segments_count'),
      acrossFlats: number(inputs, 'across_flats_mm'),
      width: number(inputs, 'width_mm'),
    });
    const sizes = expectOutcome(ring, 'cut');
    return {
      mitre_deg: sizes.mitre / degree,
      long_edge_mm: sizes.longEdge,
      short_edge_mm: sizes.shortEdge,
      across_corners_mm: sizes.acrossCorners,
    };
  },

  arc_radius: (inputs) => {
    const arc = arcFromChord(number(inputs, 'chord_mm'), number(inputs, 'rise_mm'));
    return { radius_mm: arc.radius, angle_deg: arc.angle / degree, arc_mm: arc.length };
  },

  iso286_fit: (inputs) => {
    const nominal = number(inputs, 'nominal_mm');
    const found = isoFit(nominal, text(inputs, 'hole_string'), text(inputs, 'shaft_string'));
    const fit = expectOutcome(found, 'fits');
    return {
      hole_upper_um: fit.hole.upper,
      hole_lower_um: fit.hole.lower,
      shaft_upper_um: fit.shaft.upper,
      shaft_lower_um: fit.shaft.lower,
      clearance_max_um: fit.greatestClearance,
      clearance_min_um: fit.leastClearance,
    };
  },
};
