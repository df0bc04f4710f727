import { always, choice, defect, lengthMm, parts, section, ways, words } from './build.ts';

export const identity = section('identity', 'Identity and papers', 1, {
  mark: {
    title: 'Maker’s, club or serial mark',
    weight: 1,
    appliesTo: always,
    ways: ways('sight'),
    measurements: [words('markAsStamped', 'Mark as stamped')],
    lookFor: {
      line: 'A number or name stamped in the metal, or a plate fixed to it, that ties the papers to this boiler.',
      byType: {
        locomotive: 'Look on the backhead, the foundation ring and the front tubeplate flange.',
        'vertical-multi-tube': 'Look on the top plate rim and the base ring.',
        pot: 'Often only a maker’s plate on the stand; look on the drum end too.',
      },
    },
    photosWanted: ['The mark close up, lit from one side', 'Where it sits on the boiler'],
    defects: [
      defect('mark-none', 'No mark of any kind', ['serviceable', 'function', 'watch'], [0, 0]),
      defect(
        'mark-illegible',
        'Mark worn or painted over',
        ['serviceable', 'function', 'clean'],
        [0.25, 0.5],
      ),
      defect(
        'mark-loose-plate',
        'Plate loose or screwed, could be from another boiler',
        ['attention', 'function', 'repair'],
        [0.25, 1],
        parts(1, 5),
      ),
      defect('mark-differs', 'Mark differs from the papers', ['attention', 'function', 'watch'], [0, 0]),
      defect('mark-altered', 'Mark ground off or restamped', ['unfit', 'function', 'watch'], [0, 0]),
    ],
  },
  drawing: {
    title: 'Drawing or published design',
    weight: 1,
    appliesTo: always,
    ways: ways('document'),
    measurements: [words('designName', 'Name of the design')],
    lookFor: {
      line: 'A drawing or a named published design that gives plate thicknesses, stays and working pressure.',
      byType: {
        locomotive: 'The drawing should show the stay pitch and the crown support.',
        'water-tube': 'The drawing should show drum thickness and the tube seating.',
      },
    },
    photosWanted: ['The drawing’s title block'],
    defects: [
      defect('drawing-none', 'No drawing and no known design', ['attention', 'function', 'watch'], [0, 0]),
      defect(
        'drawing-sketch',
        'Only a sketch, without thicknesses',
        ['serviceable', 'function', 'watch'],
        [0, 0],
      ),
      defect('drawing-departs', 'Built otherwise than drawn', ['attention', 'function', 'watch'], [0, 1]),
      defect(
        'drawing-thinner',
        'Plate thinner than the drawing asks',
        ['unfit', 'danger', 'condemn'],
        [0, 0],
      ),
      defect(
        'drawing-pressure',
        'Claimed pressure is above the design’s',
        ['attention', 'danger', 'adjust'],
        [0.25, 0.5],
      ),
    ],
  },
  papers: {
    title: 'Test certificates and dates',
    weight: 3,
    appliesTo: always,
    ways: ways('document'),
    measurements: [
      words('lastHydraulicOn', 'Last hydraulic test, date as written'),
      words('lastSteamOn', 'Last steam test, date as written'),
      words('testedBy', 'Tested by'),
    ],
    lookFor: {
      line: 'Who tested it, when, to what pressure, and that the number on the paper is the number on the boiler.',
      byType: {},
    },
    photosWanted: ['Each certificate, names covered if the seller asks'],
    defects: [
      defect('papers-none', 'No test papers', ['attention', 'function', 'watch'], [0, 0]),
      defect('papers-hydraulic-due', 'Hydraulic test is due', ['attention', 'function', 'watch'], [0, 0]),
      defect('papers-steam-due', 'Steam test is due', ['attention', 'function', 'watch'], [0, 0]),
      defect(
        'papers-other-boiler',
        'Certificate is for another boiler',
        ['unfit', 'function', 'watch'],
        [0, 0],
      ),
      defect('papers-altered', 'Certificate altered or unsigned', ['unfit', 'function', 'watch'], [0, 0]),
      defect(
        'papers-other-pressure',
        'Tested for a lower working pressure than is claimed',
        ['attention', 'danger', 'adjust'],
        [0.25, 0.5],
      ),
    ],
  },
  repairs: {
    title: 'Repairs and alterations agree with the history',
    weight: 2,
    appliesTo: always,
    ways: ways('document', 'sight'),
    lookFor: {
      line: 'Fresh brazing, odd bushes, plugged holes or patches that nobody mentioned.',
      byType: {
        locomotive: 'Renewed stays and patches on the firebox wrapper; a replaced front tubeplate.',
        'vertical-multi-tube': 'Plugged or renewed tubes, and a re-made base joint.',
      },
    },
    photosWanted: ['Each repair found, with a rule beside it'],
    defects: [
      defect(
        'repairs-untold',
        'Repair found that the history does not mention',
        ['attention', 'function', 'watch'],
        [0, 0],
      ),
      defect(
        'repairs-no-retest',
        'Structural repair with no test after it',
        ['attention', 'danger', 'watch'],
        [0, 0],
      ),
      defect('repairs-poor', 'Repair poorly made', ['attention', 'danger', 'repair'], [3, 10], parts(10, 60)),
      defect(
        'repairs-lower-melting',
        'Repair made with a lower-melting alloy than the boiler’s',
        ['unfit', 'danger', 'repair'],
        [4, 12],
        parts(15, 70),
      ),
      defect(
        'repairs-added-bush',
        'Bush or fitting added, not on the drawing',
        ['serviceable', 'function', 'watch'],
        [0, 0],
      ),
    ],
  },
  match: {
    title: 'Boiler matches the listing',
    weight: 1,
    appliesTo: always,
    ways: ways('sight', 'measure'),
    measurements: [
      lengthMm('outsideDiameterMm', 'Outside diameter of the barrel', 20, 1_000),
      lengthMm('barrelLengthMm', 'Length of the barrel', 20, 3_000),
      choice('metalFound', 'Metal found', {
        copper: 'Copper',
        'copper-brass': 'Copper with brass ends',
        brass: 'Brass',
        steel: 'Steel',
        stainless: 'Stainless steel',
      }),
    ],
    lookFor: {
      line: 'The same boiler, metal, size, fittings and firing as the seller described.',
      byType: {},
    },
    photosWanted: ['Whole boiler with a rule beside it'],
    defects: [
      defect('match-size', 'Size differs from the listing', ['serviceable', 'function', 'watch'], [0, 0]),
      defect('match-metal', 'Metal differs from the listing', ['attention', 'function', 'watch'], [0, 0]),
      defect('match-type', 'Another type of boiler than listed', ['attention', 'function', 'watch'], [0, 0]),
      defect(
        'match-fitting-missing',
        'A listed fitting is missing',
        ['attention', 'function', 'replace'],
        [0.5, 2],
        parts(15, 80),
      ),
      defect(
        'match-other-boiler',
        'Not the boiler in the photographs',
        ['unfit', 'function', 'watch'],
        [0, 0],
      ),
    ],
  },
});
