/** The two ways in which a workshop measures; every person chooses one. */
export const unitSystems = ['metric', 'inch'] as const;

/** Millimetres or inches; kinematics and scenes stay in millimetres and radians whichever it is. */
export type UnitSystem = (typeof unitSystems)[number];
