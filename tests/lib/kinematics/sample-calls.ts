const segments = `[{ kind: 'rise', law: 'cycloidal', height: 10, angle: 1.9 }, { kind: 'dwell', angle: 0.7 }, { kind: 'return', law: '3-4-5', height: 10, angle: 2.1 }]`;
const swings = segments.replaceAll('height: 10', 'height: 0.2');
const rise = `{ law: 'cycloidal', lift: 25, angle: 2 }`;
const roller = `{ baseRadius: 45, rollerRadius: 10, offset: 8 }`;
const cam = (follower: string, of = segments) =>
  `{ programme: programmeOf(${of}).programme, baseRadius: 40, follower: ${follower} }`;
const followers = [
  cam(`{ kind: 'knife-edge', offset: 3 }`),
  cam(`{ kind: 'roller', radius: 9, offset: 7 }`),
  cam(`{ kind: 'flat-face' }`),
  cam(`{ kind: 'swinging-roller', radius: 8, arm: 70, pivotDistance: 90 }`, swings),
  cam(`{ kind: 'swinging-face', pivotDistance: -90, faceOffset: 6 }`, swings),
];
const motion = `{ position: 0.1, velocity: 0.2, acceleration: 0.3, jerk: 0 }`;
const groove = `{ innerRadius: 20, gain: 15, slopeAngle: 2, dwellAngle: 0.5, lineOffset: 4 }`;
const geneva = `{ slots: 6, crank: 50, pin: 8, lockRadius: 38, lockClearance: 0.3 }`;

const bars = `{ crank: 40, coupler: 120, rocker: 80, frame: 100 }`;
const copier = `{ first: 400, second: 300, firstHole: 100, secondHole: 75 }`;

/** Linkages as data, by calls that make them, each with a drive that it takes. */
export const linkageCalls: readonly (readonly [call: string, drive: readonly number[]])[] = [
  [`fourBarLinkage(${bars}, { side: 'open', point: { distance: 60, angle: 0.4 } })`, [0.7]],
  [`crankSliderLinkage({ crank: 40, rod: 120, offset: 10 })`, [1.1]],
  [`yokeLinkage({ crank: 40, slant: 0.2 })`, [2]],
  [`slottedLeverLinkage(40, 100, 180)`, [0.4]],
  [`invertedLinkage({ crank: 30, frame: 110, arm: 20 })`, [0.8]],
  [`peaucellierLinkage({ long: 120, short: 50, crank: 40, centreDistance: 40 })`, [0.3]],
  [`hartLinkage({ long: 150, short: 80, share: 0.5 }, 30)`, [0.2]],
  [`wattLinkage({ arm1: 120, arm2: 110, link: 60 })`, [0.1]],
  [`straightLinkage(hoeken({ crank: 20, ground: 40 }))`, [3]],
  [`scottRussellLinkage({ crank: 60, rod: 110 })`, [0.5]],
  [`trammelLinkage({ uprightPin: 150, levelPin: 90, beside: 5 })`, [0.9]],
  [`pantographLinkage(${copier}, 'middle-to-end')`, [180, 60]],
  [`plagiographLinkage({ first: 200, second: 160, stylusArm: 90, plateAngle: 0.6 })`, [150, 70]],
  [`parallelogramLinkage({ arm: 60, ground: 140 })`, [1]],
  [`antiparallelogramLinkage({ crank: 60, ground: 140 })`, [1]],
  [`tongsLinkage({ stages: 3, bar: 160 })`, [0.6]],
  [`toggleLinkage({ first: 80, second: 100 })`, [0.3]],
];

/** Sound calls of functions whose answer is too long for an example of their own. */
export const moreCalls: readonly string[] = [
  `programmeOf(${segments})`,
  `programmeMotion(programmeOf(${segments}).programme, 1)`,
  `programmeCorners(programmeOf(${segments}).programme)`,
  `greatestPressureAngle(${rise}, ${roller})`,
  `leastBaseRadius(${rise}, { rollerRadius: 10, offset: 8 }, 0.5)`,
  `pitchCurvature(${rise}, ${roller}, 1)`,
  `sharpestBend(${rise}, ${roller})`,
  `leastFlatBaseRadius(${rise}, 5)`,
  `rolledCurve({ x: 3, y: 40 }, { x: 0, y: 5 }, { x: 0, y: 1 })`,
  ...followers.map((one) => `contactAt(${one}, 1)`),
  ...followers.map((one) => `contactForMotion(${one}, ${motion})`),
  ...followers.map((one) => `camProfile(${one}, 24)`),
  `surveyProfile(camProfile(${followers[1]}, 12).points)`,
  `cutRim(camProfile(${followers[1]}, 12).points, 9, 7)`,
  `swingingRollerPlace({ radius: 8, arm: 70, pivotDistance: 90 }, 40, ${motion})`,
  `swingingFaceContact({ pivotDistance: 90, faceOffset: 6 }, 40, ${motion})`,
  `tangentCamMotion({ baseRadius: 30, noseRadius: 10, lift: 18 }, 12, 0.8, 3)`,
  `snailOutline({ startRadius: 30, lift: 12, lobes: 4, rest: 0.3 }, 0.1, 8)`,
  `constantBreadthOutline({ side: 60, cornerRadius: 8 }, 24)`,
  `boltTravel(${groove}, 1.2)`,
  `grooveLines(${groove}, 3, 12)`,
  `genevaWheelOutline(${geneva}, 0.3)`,
  `genevaLockOutline(${geneva})`,
  `genevaTailOutline(${geneva})`,
  ...linkageCalls.map(([call]) => call),
  `couplerPointOf(fourBarPosition(${bars}, 1).open, { distance: 60, angle: 0.4 })`,
  `reachesOf('reachesOf', ${copier}, 'end-to-middle')`,
  `fromBars({ first: 3, second: 4 }, 0.5, 1.2, ORIGIN)`,
  `pointOf(hoeken({ crank: 20, ground: 40 }), 3)`,
  `ratchetOutline({ teeth: 24, tipRadius: 80, depth: 8, undercut: 0.2 })`,
];
