import { always, choice, defect, lengthMm, metals, only, parts, words, ways } from './build.ts';
import type { CriterionDraft } from './build.ts';

/** What joins the shell, what is screwed into it, and what water and fire have done to it. */
export const shellJoints: Record<'joints' | 'bushes' | 'waterside' | 'fireside', CriterionDraft> = {
  joints: {
    title: 'Seams and joints, and what they are made with',
    weight: 5,
    safetyCritical: true,
    appliesTo: always,
    ways: ways('sight', 'hydraulic'),
    measurements: [
      choice('jointMaterial', 'What the joints are made with', {
        'silver-solder': 'Silver solder or brazing alloy',
        'soft-solder': 'Soft solder',
        bronze: 'Bronze weld',
        weld: 'Weld in the parent metal',
        rivets: 'Rivets, caulked',
        'rivets-soft': 'Rivets, sealed with soft solder',
        'not-known': 'Not known',
      }),
    ],
    lookFor: {
      line: 'An even fillet all round, the colour of the alloy, no grey soft solder, no pinholes, no trails.',
      byType: {
        'vertical-cross-tube': 'Rivet heads and caulked edges: rust streaks below a rivet mean it weeps.',
        locomotive: 'The foundation ring corners and the throatplate seam.',
        pot: 'End caps on small old boilers are often soft soldered: scrape and look at the colour.',
      },
    },
    photosWanted: ['Each seam', 'A close view of the fillet at the lowest joint'],
    defects: [
      defect('joints-untidy', 'Untidy fillet, full all round', ['serviceable', 'appearance', 'none'], [0, 0]),
      defect('joints-pinhole', 'Pinhole', ['attention', 'danger', 'repair'], [1.5, 5], parts(8, 30)),
      defect('joints-short', 'Fillet short of alloy', ['attention', 'danger', 'repair'], [2, 8], parts(15, 50)),
      defect('joints-rivet-weep', 'Rivet or caulked edge weeps', ['attention', 'danger', 'repair'], [2, 8], parts(5, 30)),
      defect('joints-weep', 'Seam weeps', ['unfit', 'danger', 'repair'], [3, 10], metals([15, 60], [15, 60], [25, 110])),
      defect('joints-weld-poor', 'Weld with undercut or lack of fusion', ['unfit', 'danger', 'repair'], [4, 14], metals([30, 120], [30, 120], [40, 160])),
      defect('joints-soft-solder', 'Soft solder in a pressure joint', ['unfit', 'danger', 'repair'], [6, 20], metals([40, 140], [40, 140], [40, 140]), 'soft-solder'),
      defect('joints-crack', 'Crack along a seam', ['unfit', 'danger', 'repair'], [6, 20], metals([30, 130], [30, 130], [40, 170]), 'crack'),
    ],
  },
  bushes: {
    title: 'Bushes and threads',
    weight: 3,
    safetyCritical: true,
    appliesTo: always,
    ways: ways('sight', 'gauge', 'hydraulic'),
    measurements: [words('thread', 'Thread found'), lengthMm('wearMm', 'Wear over the thread gauge', 0, 5)],
    lookFor: {
      line: 'Bushes of bronze let into the shell and brazed; full threads; fittings that seat square without packing.',
      byType: {
        locomotive: 'The safety valve bush, the regulator flange and the wash-out plugs.',
        pot: 'The filler and safety valve bush, unscrewed at every filling, wears first.',
      },
    },
    photosWanted: ['Each bush with its fitting out'],
    defects: [
      defect('bushes-packed', 'Fitting packed out with tape or washers to seat', ['serviceable', 'function', 'adjust'], [0.5, 1], parts(1, 5)),
      defect('bushes-worn', 'Thread worn loose', ['attention', 'danger', 'repair'], [1, 3], parts(5, 20)),
      defect('bushes-stripped', 'Thread stripped or crossed', ['unfit', 'danger', 'replace'], [2, 6], parts(10, 35)),
      defect('bushes-weep', 'Weep round a bush', ['attention', 'danger', 'repair'], [1.5, 5], parts(8, 30)),
      defect('bushes-brass', 'Plain brass bush, losing its zinc', ['attention', 'danger', 'replace'], [2, 6], parts(10, 35)),
      defect('bushes-thin', 'Tapped straight into thin plate, no bush', ['attention', 'danger', 'repair'], [2, 6], parts(10, 35)),
      defect('bushes-crack', 'Bush cracked', ['unfit', 'danger', 'replace'], [2, 6], parts(10, 35), 'crack'),
    ],
  },
  waterside: {
    title: 'Scale and corrosion, water side',
    weight: 2,
    appliesTo: always,
    ways: ways('sight', 'borescope'),
    measurements: [
      lengthMm('scaleThicknessMm', 'Thickness of scale', 0, 20),
      lengthMm('pitDepthMm', 'Deepest pit', 0, 15),
    ],
    lookFor: {
      line: 'Through every bush with a lamp: scale, sludge at the bottom, pits at the water line, green or red deposits.',
      byType: {
        'water-tube': 'The lower drum and the bottom of each tube, where scale settles.',
        locomotive: 'On the firebox crown and along the foundation ring.',
      },
    },
    photosWanted: ['Through the largest bush', 'What came out when it was rinsed'],
    defects: [
      defect('waterside-film', 'Thin film of scale', ['serviceable', 'function', 'watch'], [0, 0]),
      defect('waterside-scale', 'Scale that wants descaling', ['attention', 'function', 'clean'], [1, 4], parts(8, 25)),
      defect('waterside-sludge', 'Sludge in the bottom', ['serviceable', 'function', 'clean'], [0.5, 2], parts(2, 8)),
      defect('waterside-oil', 'Oil in the boiler', ['attention', 'function', 'clean'], [1, 3], parts(5, 15)),
      defect('waterside-rust', 'Rust on steel', ['attention', 'function', 'clean'], [1, 4], parts(8, 25)),
      defect('waterside-pits', 'Pits', ['attention', 'danger', 'watch'], [0, 2]),
      defect('waterside-pits-deep', 'Pits a third of the wall deep or more', ['unfit', 'danger', 'condemn'], [8, 26], metals([80, 300], [80, 280], [80, 280])),
    ],
  },
  fireside: {
    title: 'Soot and wasting, fire side',
    weight: 2,
    appliesTo: only({ firings: ['coal', 'gas', 'spirit', 'oil', 'none'] }),
    ways: ways('sight'),
    lookFor: {
      line: 'Soot, tar or ash left damp; metal thinned by flame or by wet ash.',
      byType: {
        locomotive: 'The smokebox bottom and behind the firehole ring, where damp ash eats metal.',
        'vertical-cross-tube': 'Round the grate line inside the firebox.',
      },
    },
    photosWanted: ['Fire space after brushing'],
    defects: [
      defect('fireside-soot', 'Heavy soot', ['serviceable', 'function', 'clean'], [0.5, 1.5]),
      defect('fireside-tar', 'Tar or varnish', ['serviceable', 'function', 'clean'], [0.5, 2], parts(3, 10)),
      defect('fireside-ash', 'Damp ash left in', ['serviceable', 'function', 'clean'], [0.5, 1]),
      defect('fireside-wasted', 'Plate wasted by flame or ash', ['attention', 'danger', 'repair'], [4, 14], metals([30, 120], [30, 120], [30, 120])),
      defect('fireside-flame-cut', 'Metal cut by the flame at one spot', ['unfit', 'danger', 'repair'], [4, 14], metals([30, 120], [30, 120], [30, 120])),
    ],
  },
};
