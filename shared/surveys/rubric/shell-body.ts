import { always, count, defect, lengthMm, metals, only, parts, ways } from './build.ts';
import type { CriterionDraft } from './build.ts';

const thinnest = lengthMm('thinnestMm', 'Thinnest wall reading', 0.1, 25);

/** The plates, tubes and stays that hold the pressure. */
export const shellBody: Record<'barrel' | 'plates' | 'flue' | 'tubes' | 'stays', CriterionDraft> = {
  barrel: {
    title: 'Barrel',
    weight: 5,
    safetyCritical: true,
    appliesTo: always,
    ways: ways('sight', 'measure', 'hydraulic'),
    measurements: [
      lengthMm('outOfRoundMm', 'Out of round, widest less narrowest', 0, 100),
      thinnest,
      lengthMm('dentDepthMm', 'Depth of the deepest dent', 0, 50),
    ],
    lookFor: {
      line: 'Dents, flats, bulges, corrosion at the saddle and under lagging, green or white trails from a weep.',
      byType: {
        locomotive: 'Along the bottom of the barrel, and where it enters the throatplate.',
        pot: 'Overheating above the water line: dull, blistered metal over the flame.',
        'water-tube': 'Each drum, and between the tube holes.',
        'vertical-cross-tube': 'Rust at the base ring and along the lowest rivets.',
      },
    },
    photosWanted: ['Both sides of the barrel', 'The underside or the lowest foot of it'],
    defects: [
      defect('barrel-dent', 'Dent', ['serviceable', 'appearance', 'watch'], [0, 0]),
      defect('barrel-dent-deep', 'Dent deeper than the wall is thick', ['attention', 'danger', 'repair'], [3, 8], metals([10, 50], [10, 50], [10, 40])),
      defect('barrel-pitting', 'Pitting outside', ['attention', 'danger', 'repair'], [2, 8], metals([10, 60], [10, 60], [15, 80])),
      defect('barrel-wasted', 'Wasted by rust or chafing at the saddle', ['attention', 'danger', 'repair'], [4, 14], metals([30, 120], [30, 120], [40, 160])),
      defect('barrel-weep', 'Weep through the plate', ['unfit', 'danger', 'repair'], [3, 12], metals([15, 60], [15, 60], [30, 120])),
      defect('barrel-overheated', 'Metal overheated, scaled or blistered', ['unfit', 'danger', 'condemn'], [10, 30], metals([120, 400], [100, 350], [100, 350])),
      defect('barrel-crack', 'Crack', ['unfit', 'danger', 'condemn'], [10, 30], metals([120, 400], [100, 350], [100, 350]), 'crack'),
      defect('barrel-bulge', 'Bulge', ['unfit', 'danger', 'condemn'], [10, 30], metals([120, 400], [100, 350], [100, 350]), 'bulge'),
    ],
  },
  plates: {
    title: 'End plates and tubeplates',
    weight: 5,
    safetyCritical: true,
    appliesTo: always,
    ways: ways('sight', 'borescope', 'hydraulic'),
    measurements: [
      lengthMm('bulgeMm', 'Dished out from flat under a straight edge', 0, 50),
      lengthMm('thinnestMm', 'Thinnest wall reading', 0.1, 25),
    ],
    lookFor: {
      line: 'Flatness under a straight edge, cracks between tube holes and at flanges, burnt ligaments.',
      byType: {
        'vertical-multi-tube': 'The bottom plate over the fire, and the ligaments of the top plate above the water.',
        locomotive: 'The firebox tubeplate between tubes, and the backhead round the firehole.',
        'return-flue': 'Between the furnace flue and the lowest row of tubes.',
      },
    },
    photosWanted: ['Each plate square on', 'The tube ends close up'],
    defects: [
      defect('plates-stain', 'Stain round a fitting', ['serviceable', 'appearance', 'clean'], [0.25, 0.5]),
      defect('plates-pitted', 'Pitted on the water side', ['attention', 'danger', 'watch'], [0, 1]),
      defect('plates-dished', 'Slightly dished, not moving under pressure', ['attention', 'danger', 'repair'], [4, 12], metals([20, 80], [20, 80], [20, 80])),
      defect('plates-burnt', 'Burnt or wasted by the fire', ['attention', 'danger', 'repair'], [6, 18], metals([40, 140], [40, 140], [40, 120])),
      defect('plates-weep', 'Weep through a plate or ligament', ['unfit', 'danger', 'repair'], [4, 14], metals([20, 90], [20, 90], [30, 120])),
      defect('plates-crack', 'Crack at a flange or between tube holes', ['unfit', 'danger', 'replace'], [10, 28], metals([60, 220], [60, 200], [60, 200]), 'crack'),
      defect('plates-bulge', 'Bulge, or moves under pressure', ['unfit', 'danger', 'replace'], [10, 28], metals([60, 220], [60, 200], [60, 200]), 'bulge'),
    ],
  },
  flue: {
    title: 'Flue or firebox, inside and out',
    weight: 5,
    safetyCritical: true,
    appliesTo: only({ traits: ['flue', 'firebox'] }),
    ways: ways('sight', 'borescope', 'hydraulic'),
    measurements: [
      lengthMm('ovalityMm', 'Oval by, widest less narrowest', 0, 100),
      thinnest,
      lengthMm('insideDiameterMm', 'Inside diameter of the flue', 5, 600),
    ],
    lookFor: {
      line: 'Roundness from end to end, the crown, thin or flaking metal over the fire, weeps at the ends.',
      byType: {
        locomotive: 'The crown sheet from inside the firebox: sagging between stays means it has been short of water.',
        'vertical-centre-flue': 'The flue at water level, where scale and heat meet.',
        'vertical-cross-tube': 'Where each cross tube enters, and the uptake above the water.',
        'return-flue': 'The furnace flue opposite the flame, and the combustion chamber crown.',
      },
    },
    photosWanted: ['Down the flue with a lamp at the far end', 'The crown'],
    defects: [
      defect('flue-flaking', 'Flaking or sooty skin, metal sound beneath', ['serviceable', 'function', 'clean'], [0.5, 1.5]),
      defect('flue-oval', 'Out of round', ['attention', 'danger', 'watch'], [0, 2]),
      defect('flue-thin', 'Thin over the fire', ['attention', 'danger', 'replace'], [10, 26], metals([60, 200], [60, 200], [60, 180])),
      defect('flue-weep', 'Weep at an end or a cross tube', ['unfit', 'danger', 'repair'], [4, 12], metals([20, 70], [20, 70], [30, 110])),
      defect('flue-crown-sag', 'Crown sagged between stays', ['unfit', 'danger', 'replace'], [14, 36], metals([100, 320], [100, 300], [100, 300]), 'collapse'),
      defect('flue-collapse', 'Flue flattened or collapsed', ['unfit', 'danger', 'replace'], [14, 36], metals([100, 320], [100, 300], [100, 300]), 'collapse'),
      defect('flue-crack', 'Crack in flue or firebox', ['unfit', 'danger', 'replace'], [12, 32], metals([80, 280], [80, 260], [80, 260]), 'crack'),
    ],
  },
  tubes: {
    title: 'Fire tubes or water tubes',
    weight: 4,
    safetyCritical: true,
    appliesTo: only({ traits: ['fire-tubes', 'water-tubes'] }),
    ways: ways('sight', 'borescope', 'hydraulic'),
    measurements: [
      count('tubesCounted', 'Tubes counted', 300),
      count('tubesBlocked', 'Tubes blocked', 300),
      count('tubesPlugged', 'Tubes plugged', 300),
      thinnest,
    ],
    lookFor: {
      line: 'Daylight through every tube, thin ends, weeps round the ends, plugs.',
      byType: {
        'water-tube': 'Sagging or blistered tubes over the burner, and furred bores.',
        'vertical-multi-tube': 'The top ends, which stand above the water.',
        'horizontal-centre-flue': 'Each water tube where it crosses the flue, in the full heat of the burner.',
        locomotive: 'The firebox ends, beaded or brazed, and wasting in the first inch.',
      },
    },
    photosWanted: ['All the tube ends in one picture', 'Any tube that weeps or is blocked'],
    defects: [
      defect('tubes-soot', 'Choked with soot', ['serviceable', 'function', 'clean'], [0.5, 1.5]),
      defect('tubes-plugged', 'One or more tubes plugged', ['serviceable', 'function', 'watch'], [0, 0]),
      defect('tubes-furred', 'Water tube furred inside', ['attention', 'danger', 'clean'], [1, 4], parts(5, 20)),
      defect('tubes-thin-ends', 'Ends wasted thin', ['attention', 'danger', 'replace'], [5, 16], metals([25, 100], [25, 90], [25, 90])),
      defect('tubes-weep', 'Tube end weeps', ['attention', 'danger', 'repair'], [2, 8], metals([10, 50], [10, 50], [15, 60])),
      defect('tubes-blistered', 'Tube blistered or sagged by heat', ['unfit', 'danger', 'replace'], [4, 14], metals([20, 90], [20, 80], [20, 80]), 'bulge'),
      defect('tubes-flattened', 'Tube flattened', ['unfit', 'danger', 'replace'], [4, 14], metals([20, 90], [20, 80], [20, 80]), 'collapse'),
      defect('tubes-split', 'Tube split', ['unfit', 'danger', 'replace'], [4, 14], metals([20, 90], [20, 80], [20, 80]), 'crack'),
    ],
  },
  stays: {
    title: 'Stays and staybolts',
    weight: 3,
    safetyCritical: true,
    appliesTo: only({ traits: ['stays'] }),
    ways: ways('sight', 'sounding', 'hydraulic'),
    measurements: [
      lengthMm('pitchMm', 'Widest pitch between stays', 3, 200),
      lengthMm('diameterMm', 'Diameter of a stay', 1, 40),
      count('staysCounted', 'Stays counted', 500),
    ],
    lookFor: {
      line: 'Every stay that the drawing shows is there, heads tight and dry, a clear ring when tapped.',
      byType: {
        locomotive: 'The outer rows and the throatplate corners break first; look for a dull note and a rust trail.',
        'return-flue': 'Longitudinal stays: nuts tight at both ends, no necking where they pass the plate.',
      },
    },
    photosWanted: ['Stay heads on each side', 'Any head that weeps'],
    defects: [
      defect('stays-damp', 'Damp stay head', ['attention', 'danger', 'repair'], [1, 4], parts(5, 25)),
      defect('stays-nut-loose', 'Nut loose on a longitudinal stay', ['attention', 'danger', 'adjust'], [0.5, 2], parts(1, 10)),
      defect('stays-head-wasted', 'Heads burnt away or wasted', ['attention', 'danger', 'replace'], [3, 10], metals([15, 60], [15, 60], [12, 50])),
      defect('stays-dull', 'Stay sounds dull, likely broken inside', ['unfit', 'danger', 'replace'], [3, 10], metals([15, 60], [15, 60], [12, 50])),
      defect('stays-broken', 'Stay broken', ['unfit', 'danger', 'replace'], [3, 10], metals([15, 60], [15, 60], [12, 50]), 'crack'),
      defect('stays-missing', 'Stay left out that the drawing shows', ['unfit', 'danger', 'repair'], [4, 14], metals([20, 80], [20, 80], [18, 70])),
      defect('stays-pitch', 'Pitched wider than the plate will stand', ['unfit', 'danger', 'repair'], [6, 18], metals([30, 110], [30, 110], [25, 100])),
    ],
  },
};
