import { always, defect, only, parts, pressurePa, rate, section, ways } from './build.ts';

const withFeed = only({
  traits: ['pressure-feed'],
  fittings: ['check-valve', 'hand-pump', 'engine-pump', 'injector'],
});
const delivery = [
  rate('deliveryKgPerH', 'Water delivered', 'kg/h', 500),
  pressurePa('deliveredAgainstPa', 'Against a pressure of', 6_000_000),
];

export const feed = section('feed', 'Feed and steam fittings', 20, {
  check: {
    title: 'Check valves',
    weight: 3,
    safetyCritical: true,
    ifNotFitted: 'repair-before-steaming',
    appliesTo: withFeed,
    ways: ways('sight', 'hydraulic', 'steam'),
    measurements: [
      rate('leakBackPaPerMin', 'Pressure lost back through it in a minute', 'Pa/min', 6_000_000),
    ],
    lookFor: {
      line: 'One on each feed, the ball or disc lifting freely and shutting at once, no hot water back down the pipe.',
      byType: { locomotive: 'The clack on each side: the pipe below should stay cold to the hand.' },
    },
    photosWanted: ['Each check valve', 'Ball and seat if taken down'],
    defects: [
      defect(
        'check-weep',
        'Weeps at its cap or union',
        ['serviceable', 'function', 'adjust'],
        [0.25, 0.75],
        parts(1, 3),
      ),
      defect('check-lazy', 'Slow to shut', ['attention', 'function', 'repair'], [0.5, 1.5], parts(2, 8)),
      defect('check-passes', 'Passes back', ['attention', 'danger', 'repair'], [0.5, 2], parts(3, 12)),
      defect(
        'check-stuck-shut',
        'Stuck shut, no feed goes in',
        ['unfit', 'danger', 'replace'],
        [0.5, 1.5],
        parts(10, 30),
      ),
      defect('check-stuck-open', 'Stuck open', ['unfit', 'danger', 'replace'], [0.5, 1.5], parts(10, 30)),
      defect(
        'check-one-for-two',
        'Two feeds share one check valve',
        ['attention', 'function', 'replace'],
        [1, 3],
        parts(12, 35),
      ),
    ],
  },
  first: {
    title: 'First means of feed',
    weight: 3,
    safetyCritical: true,
    ifNotFitted: 'repair-before-steaming',
    appliesTo: withFeed,
    ways: ways('sight', 'delivery'),
    measurements: delivery,
    lookFor: {
      line: 'Puts water in against working pressure, faster than the fire boils it away.',
      byType: {
        'vertical-centre-flue':
          'A hand pump on the baseboard is the usual first feed: see that it primes and does not blow back.',
        locomotive: 'The injector must pick up first time with cold water and hold on.',
      },
    },
    photosWanted: ['The pump or injector and its pipes'],
    defects: [
      defect(
        'first-gland',
        'Gland or packing leaks',
        ['serviceable', 'function', 'adjust'],
        [0.25, 1],
        parts(1, 5),
      ),
      defect(
        'first-loses-prime',
        'Loses its prime',
        ['attention', 'function', 'repair'],
        [0.5, 2],
        parts(2, 10),
      ),
      defect(
        'first-slow',
        'Delivers less than the boiler evaporates',
        ['attention', 'danger', 'replace'],
        [1, 3],
        parts(25, 90),
      ),
      defect('first-worn', 'Ram or barrel worn', ['attention', 'function', 'repair'], [1, 4], parts(8, 30)),
      defect('first-rusted', 'Steel parts rusted', ['attention', 'function', 'repair'], [1, 3], parts(5, 25)),
      defect('first-dead', 'Delivers nothing', ['unfit', 'danger', 'replace'], [1, 3], parts(25, 90)),
    ],
  },
  second: {
    title: 'Second means of feed',
    weight: 2,
    appliesTo: withFeed,
    ways: ways('sight', 'delivery'),
    measurements: delivery,
    lookFor: {
      line: 'A second way of putting water in that does not depend on the first, above all on a coal-fired boiler.',
      byType: { locomotive: 'Hand pump in the tender, or a second injector: try it under pressure.' },
    },
    photosWanted: ['The second pump or injector'],
    defects: [
      defect(
        'second-gland',
        'Gland or packing leaks',
        ['serviceable', 'function', 'adjust'],
        [0.25, 1],
        parts(1, 5),
      ),
      defect('second-slow', 'Delivers little', ['attention', 'function', 'repair'], [0.5, 3], parts(5, 30)),
      defect(
        'second-needs-engine',
        'Works only with the engine running',
        ['serviceable', 'function', 'watch'],
        [0, 0],
      ),
      defect(
        'second-disconnected',
        'Disconnected or incomplete',
        ['attention', 'function', 'repair'],
        [0.5, 2],
        parts(5, 30),
      ),
      defect('second-dead', 'Delivers nothing', ['unfit', 'function', 'replace'], [1, 3], parts(25, 90)),
    ],
  },
  stop: {
    title: 'Stop valve or regulator',
    weight: 2,
    appliesTo: only({ traits: ['pressure-feed'], fittings: ['stop-valve', 'superheater'] }),
    ways: ways('sight', 'hydraulic', 'steam'),
    lookFor: {
      line: 'Shuts off fully, opens by degrees, gland dry, handle insulated.',
      byType: { locomotive: 'The regulator must shut: a boiler that creeps is a runaway.' },
    },
    photosWanted: ['The valve or regulator handle and gland'],
    defects: [
      defect('stop-gland', 'Gland leaks', ['serviceable', 'function', 'adjust'], [0.25, 1], parts(1, 4)),
      defect('stop-passes', 'Passes when shut', ['attention', 'function', 'repair'], [1, 4], parts(5, 25)),
      defect('stop-stiff', 'Stiff', ['serviceable', 'function', 'repair'], [0.5, 1.5], parts(1, 6)),
      defect('stop-seized', 'Seized', ['unfit', 'function', 'replace'], [1, 4], parts(15, 60)),
      defect(
        'stop-handle',
        'Handle missing or bare hot metal',
        ['serviceable', 'function', 'replace'],
        [0.25, 0.75],
        parts(2, 8),
      ),
    ],
  },
  pipes: {
    title: 'Pipework and unions',
    weight: 2,
    appliesTo: always,
    ways: ways('sight', 'steam'),
    lookFor: {
      line: 'Pipes of copper, silver soldered nipples, unions that pull up without strain, supported against shaking.',
      byType: {
        'water-tube': 'The superheater, if there is one, is in the hottest gas: look for blisters.',
        pot: 'The steam pipe to the engine is often soft soldered: look at the colour.',
      },
    },
    photosWanted: ['Pipe runs from both sides'],
    defects: [
      defect(
        'pipes-union-weep',
        'Union weeps',
        ['serviceable', 'function', 'adjust'],
        [0.25, 1],
        parts(1, 5),
      ),
      defect(
        'pipes-kinked',
        'Pipe kinked or strained',
        ['attention', 'function', 'replace'],
        [0.5, 2],
        parts(4, 15),
      ),
      defect(
        'pipes-soft-nipple',
        'Nipple soft soldered in a steam pipe',
        ['attention', 'danger', 'repair'],
        [0.5, 2],
        parts(3, 12),
      ),
      defect(
        'pipes-rubber',
        'Rubber or plastic under pressure',
        ['unfit', 'danger', 'replace'],
        [0.5, 2],
        parts(5, 20),
      ),
      defect(
        'pipes-unsupported',
        'Pipe unsupported',
        ['serviceable', 'function', 'repair'],
        [0.25, 1],
        parts(1, 5),
      ),
      defect(
        'pipes-split',
        'Pipe split or holed',
        ['unfit', 'danger', 'replace'],
        [0.5, 2],
        parts(4, 20),
        'crack',
      ),
    ],
  },
  tank: {
    title: 'Feed tank, water and strainer',
    weight: 2,
    appliesTo: only({ fittings: ['feed-tank', 'hand-pump', 'engine-pump', 'injector'] }),
    ways: ways('sight'),
    lookFor: {
      line: 'A clean tank that holds enough, a strainer on the suction, and no oil coming back with the exhaust.',
      byType: { locomotive: 'Tender or side tanks: strainer, sludge, soldered seams.' },
    },
    photosWanted: ['Inside the tank'],
    defects: [
      defect('tank-dirty', 'Dirt or scale in it', ['serviceable', 'function', 'clean'], [0.25, 1]),
      defect('tank-no-strainer', 'No strainer', ['attention', 'function', 'replace'], [0.25, 1], parts(2, 8)),
      defect('tank-leak', 'Leaks', ['attention', 'function', 'repair'], [0.5, 2], parts(2, 10)),
      defect(
        'tank-oil',
        'Oil comes back with the exhaust',
        ['attention', 'function', 'repair'],
        [1, 3],
        parts(10, 35),
      ),
      defect('tank-small', 'Holds too little for the boiler', ['serviceable', 'function', 'watch'], [0, 0]),
      defect('tank-rust', 'Rusting', ['serviceable', 'function', 'repair'], [0.5, 2], parts(3, 12)),
    ],
  },
});
