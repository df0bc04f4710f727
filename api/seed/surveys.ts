import type { SeedSurvey } from './findings.ts';

/** What the surveyors found, by boiler; one was surveyed again by somebody else. */
export const surveys: Record<string, SeedSurvey> = {
  'return-flue': {
    scope: 'full',
    findings: {
      'shell.barrel': { grade: 'sound', measurements: [{ quantity: 'thinnestMm', value: 2.58 }] },
      'shell.plates': {
        grade: 'sound',
        measurements: [
          { quantity: 'thinnestMm', value: 3.2 },
          { quantity: 'supportPitchMm', value: 21 },
        ],
      },
      'shell.flue': {
        grade: 'sound',
        measurements: [
          { quantity: 'thinnestMm', value: 1.98 },
          { quantity: 'lengthMm', value: 205 },
        ],
      },
      'shell.stays': {
        grade: 'sound',
        measurements: [
          { quantity: 'pitchMm', value: 20 },
          { quantity: 'diameterMm', value: 5.55 },
          { quantity: 'threadsPerInch', value: 40 },
        ],
      },
      'shell.joints': {
        grade: 'sound',
        measurements: [{ quantity: 'jointMaterial', value: 'silver-solder' }],
      },
      'safety.gauge': {
        grade: 'sound',
        measurements: [
          { quantity: 'fullScalePa', value: 1100000 },
          { quantity: 'zeroErrorPa', value: 0 },
          { quantity: 'midPointErrorPa', value: 3_000 },
          { quantity: 'workingPointErrorPa', value: 5_000 },
          { quantity: 'siphonFitted', value: true },
          { quantity: 'redLine', value: true },
        ],
      },
      'safety.capacity': {
        grade: 'sound',
        measurements: [
          { quantity: 'valveBoreMm', value: 6.5 },
          { quantity: 'valveLift', value: 'high' },
          { quantity: 'valvesFitted', value: 1 },
        ],
      },
      'safety.glass': {
        grade: 'sound',
        measurements: [
          { quantity: 'lowestLevelAboveCrownMm', value: 9 },
          { quantity: 'waterInGlassL', value: 0.19 },
        ],
      },
      'feed.first': { grade: 'sound', measurements: [{ quantity: 'deliveryKgPerH', value: 5.4 }] },
      'casing.finish': { grade: 'serviceable', defects: [{ code: 'finish-tarnished', note: 'Honest use.' }] },
      'safety.valve': { grade: 'sound', note: 'Both valves tried, second lifts 3 psi above the first.' },
      'shell.fireside': { grade: 'serviceable', note: 'Light soot in the return tubes, brushes out.' },
    },
    pictures: {
      'safety.valve': [
        { file: 'b3-marine-boiler-dome-and-lagging', alt: 'Dome with safety valve and gauge, as examined.' },
      ],
      'shell.plates': [{ file: 'b2-marine-boiler-front-end', alt: 'Front end with the smokebox door shut.' }],
    },
    hydraulic: { firstTest: false, heldPa: 940_000, fellPa: 3_000 },
    steam: { evaporationKgPerH: 2.6, coPpmAtOperator: 4 },
    summary:
      'A boiler that has been looked after, with papers to show it. I would be glad to see it go to somebody who keeps the papers up.',
  },
  'return-flue-again': {
    scope: 'full',
    findings: {
      'shell.barrel': { grade: 'sound', measurements: [{ quantity: 'thinnestMm', value: 2.61 }] },
      'shell.joints': {
        grade: 'sound',
        measurements: [{ quantity: 'jointMaterial', value: 'silver-solder' }],
      },
      'shell.fireside': { grade: 'serviceable', note: 'Soot, no more than a season’s worth.' },
      'safety.gauge': {
        grade: 'sound',
        measurements: [
          { quantity: 'fullScalePa', value: 1_100_000 },
          { quantity: 'zeroErrorPa', value: 0 },
          { quantity: 'midPointErrorPa', value: 5_000 },
          { quantity: 'workingPointErrorPa', value: 7_000 },
          { quantity: 'siphonFitted', value: true },
          { quantity: 'redLine', value: true },
        ],
      },
      'safety.capacity': {
        grade: 'sound',
        measurements: [
          { quantity: 'valveBoreMm', value: 6.5 },
          { quantity: 'valveLift', value: 'high' },
          { quantity: 'valvesFitted', value: 1 },
        ],
      },
      'safety.glass': { grade: 'sound', measurements: [{ quantity: 'lowestLevelAboveCrownMm', value: 9 }] },
      'feed.check': {
        grade: 'serviceable',
        defects: [{ code: 'check-weep', where: 'cap of the left one', note: 'A bead of water at 90 psi.' }],
      },
      'casing.lagging': {
        grade: 'serviceable',
        defects: [{ code: 'lagging-bands', note: 'Second band from the front turns by hand.' }],
      },
      'casing.mount': {
        grade: 'attention',
        defects: [{ code: 'mount-loose', where: 'rear saddle', note: 'Two of its four screws turn.' }],
      },
      'casing.finish': { grade: 'serviceable', defects: [{ code: 'finish-tarnished' }] },
    },
    pictures: {
      'casing.mount': [
        {
          file: 'b1-marine-boiler-threequarter',
          alt: 'Boiler on its base, from the side of the loose saddle.',
        },
      ],
    },
    hydraulic: { firstTest: false, heldPa: 936_000, fellPa: 4_000 },
    steam: { evaporationKgPerH: 2.5, coPpmAtOperator: 5 },
    summary:
      'I found the shell as Ruth Calder did a fortnight before me. The rear saddle wants its screws before the boiler travels.',
  },
  'twelve-tube': {
    scope: 'full',
    findings: {
      'shell.barrel': { grade: 'sound', measurements: [{ quantity: 'thinnestMm', value: 1.96 }] },
      'shell.joints': {
        grade: 'sound',
        measurements: [{ quantity: 'jointMaterial', value: 'silver-solder' }],
      },
      'safety.gauge': {
        grade: 'sound',
        measurements: [
          { quantity: 'fullScalePa', value: 1000000 },
          { quantity: 'zeroErrorPa', value: 0 },
          { quantity: 'midPointErrorPa', value: 3_000 },
          { quantity: 'workingPointErrorPa', value: 5_000 },
          { quantity: 'siphonFitted', value: true },
          { quantity: 'redLine', value: true },
        ],
      },
      'safety.capacity': {
        grade: 'sound',
        measurements: [
          { quantity: 'valveBoreMm', value: 5.5 },
          { quantity: 'valveLift', value: 'high' },
          { quantity: 'valvesFitted', value: 1 },
        ],
      },
      'safety.glass': {
        grade: 'attention',
        defects: [
          { code: 'glass-sluggish', where: 'lower passage', note: 'Level takes four seconds to come back.' },
        ],
        note: 'Water cloudy. Passage wants a drill run through it and the glass a clean.',
      },
      'feed.check': {
        grade: 'attention',
        defects: [{ code: 'check-passes', where: 'balloon 20', note: 'Three drips a minute at 40 psi.' }],
      },
      'firing.burner': {
        grade: 'attention',
        defects: [{ code: 'burner-tile-cracked', note: 'Face rusted and lifting at one edge.' }],
      },
      'casing.finish': { grade: 'serviceable', defects: [{ code: 'finish-tarnished' }] },
    },
    pictures: {
      'safety.glass': [
        { file: 'k03-cloudy-water-gauge', alt: 'Water gauge glass half full of cloudy water.' },
      ],
      'feed.check': [
        {
          file: 'k09-check-valve-leaking',
          alt: 'Check valve with a drip hanging from it and a pale trail below.',
        },
      ],
      'firing.burner': [
        {
          file: 'k06-burner-head-soot-corrosion',
          alt: 'Burner head with a rusted face and a patch of soot.',
        },
      ],
      'shell.barrel': [
        {
          file: 'k08-hydraulic-test-set-up',
          alt: 'Hydraulic test set up: hand pump and test gauge on the boiler.',
        },
      ],
    },
    hydraulic: { firstTest: false, heldPa: 838_000, fellPa: 6_000 },
    steam: { evaporationKgPerH: 1.7, coPpmAtOperator: 11 },
    summary: 'The shell is good. Three small jobs, all on the bench, and it is a boiler again.',
  },
  'maroon-gas': {
    scope: 'full',
    findings: {
      'firing.flame': {
        grade: 'unfit',
        defects: [
          {
            code: 'flame-lights-back',
            note: 'Lights back into the mixing tube when turned down; I stopped the test.',
          },
        ],
      },
      'firing.burner': {
        grade: 'attention',
        defects: [{ code: 'burner-oversize', note: 'Burner made for a longer flue.' }],
      },
      'firing.draught': {
        grade: 'attention',
        defects: [{ code: 'draught-choked', note: 'Soot bridge between the first two cross tubes.' }],
      },
      'casing.lagging': {
        grade: 'notExamined',
        reason:
          'Not disturbed: the seller does not know what the lagging is, and old lagging may hold asbestos.',
      },
    },
    pictures: {
      'firing.burner': [
        { file: 'g2-horizontal-gas-boiler-burner-end', alt: 'Burner end with its hose, as found.' },
      ],
      'firing.flame': [{ file: 'k06-burner-head-soot-corrosion', alt: 'Burner head, sooted and corroded.' }],
      'firing.draught': [
        {
          file: 'g1-horizontal-gas-boiler-threequarter',
          alt: 'Chimney end, where the soot bridge was found.',
        },
      ],
      'safety.valve': [{ file: 'k05-safety-valve-verdigris', alt: 'Verdigris round the safety valve.' }],
    },
    hydraulic: { firstTest: true, heldPa: 852_000, fellPa: 5_000 },
    steam: {
      minutesToWorkingPressure: 16,
      flameSettled: false,
      coPpmAtOperator: 140,
      evaporationKgPerH: null,
      note: 'Meter at 140 ppm at the operator; gas shut off and the workshop aired.',
    },
    summary:
      'The shell held its test well. The firing is another matter: do not light it as it is. A burner of the right size and a clean flue should cure both faults, and then it must be tried again.',
  },
  'steel-cross-tube': {
    scope: 'external',
    findings: {
      'identity.papers': {
        grade: 'attention',
        defects: [{ code: 'papers-hydraulic-due', note: 'Last paper is of 1999.' }],
        measurements: [{ quantity: 'lastHydraulicOn', value: '17 April 1999' }],
      },
      'shell.waterside': {
        grade: 'serviceable',
        note: 'Seen through both handholes with a lamp: even red rust, no deep pits where the lamp reaches.',
      },
      'casing.finish': {
        grade: 'serviceable',
        defects: [{ code: 'finish-bare-rust', where: 'along the seam' }],
      },
    },
    pictures: {
      'shell.joints': [
        {
          file: 'h2-steel-cross-tube-boiler-rivets-rust',
          alt: 'Riveted seam and handhole doors with rust runs.',
        },
      ],
      'shell.waterside': [
        { file: 'k02-pitted-inner-plate', alt: 'Inner plate seen through a handhole by lamp.' },
      ],
    },
    summary:
      'Nothing seen cold that would condemn it, and nothing proved either. It needs wall-thickness readings along the water line and a hydraulic test before anybody thinks of a fire.',
  },
  'green-vertical': {
    scope: 'hydraulic',
    findings: {
      'shell.joints': {
        grade: 'sound',
        measurements: [{ quantity: 'jointMaterial', value: 'silver-solder' }],
      },
      'identity.papers': { grade: 'attention', defects: [{ code: 'papers-none' }] },
      'identity.drawing': {
        grade: 'attention',
        defects: [{ code: 'drawing-none' }],
        measurements: [{ quantity: 'designName', value: 'None known' }],
      },
      'feed.first': {
        grade: 'serviceable',
        defects: [{ code: 'first-gland', note: 'Drips at the gland; repack.' }],
      },
      'casing.mount': { grade: 'attention', defects: [{ code: 'mount-rust', where: 'base ring screws' }] },
      'casing.finish': { grade: 'serviceable', defects: [{ code: 'finish-chipped' }] },
    },
    pictures: {
      'casing.mount': [
        { file: 'f2-vertical-centre-flue-baseboard-rust', alt: 'Rust round the screws of the base ring.' },
      ],
      'feed.first': [{ file: 'f3-vertical-centre-flue-hand-pump', alt: 'Hand pump in its tank.' }],
      'identity.papers': [{ file: 'k10-blank-oval-plate', alt: 'Plate without any marking.' }],
    },
    hydraulic: { firstTest: true, heldPa: 705_000, fellPa: 2_500 },
    summary:
      'Held twice the claimed pressure for ten minutes without a weep. Steam was not part of this survey.',
  },
};
