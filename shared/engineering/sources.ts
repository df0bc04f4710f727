/** How sure a source is. */
export const surenesses = {
  published: 'Published, and checked against it',
  derived: 'Derived from a published formula',
  practice: 'Common practice in the trade, no single source',
  memory: 'From memory, to be confirmed',
} as const;
export type Sureness = keyof typeof surenesses;

export interface Source {
  /** Title, edition and clause. */
  title: string;
  sureness: Sureness;
}

const published = (title: string): Source => ({ title, sureness: 'published' });
const derived = (title: string): Source => ({ title, sureness: 'derived' });
const practice = (title: string): Source => ({ title, sureness: 'practice' });
const memory = (title: string): Source => ({ title, sureness: 'memory' });

/** Where every formula and figure of the workings comes from. */
export const sources = {
  geometry: derived('Plane and solid geometry'),
  statics: derived('Statics'),
  'steam-saturation': published('IAPWS R7-97(2012), Industrial Formulation 1997, region 4, eqs 30 and 31'),
  'steam-regions': published('IAPWS R7-97(2012), Industrial Formulation 1997, regions 1 and 2'),
  'heat-balance': derived('Heat balance on IAPWS R7-97(2012)'),
  'copper-stress': published(
    'Copper Development Association, Copper Tube Handbook, rated pressures: stress of annealed copper by temperature',
  ),
  'steel-stress': memory('95 N/mm² for mild steel, near the 13,800 psi of the NB-23 Part 2 S2.10.4 table'),
  'stainless-stress': memory('ASME II-D, type 304 plate, the lower line of its table'),
  'metal-margin': memory('Shell-boiler standards take metal in the fire hotter than the steam'),
  'shell-ug27': published('ASME VIII-1 UG-27(c)(1)'),
  'tube-b31': published('ASME B31 form, as in the Copper Tube Handbook'),
  'trade-barrel': practice('Model-boiler handbooks: copper of 25,000 psi, factor 8, joint 0.8'),
  'seam-efficiency': practice('Seam efficiencies as the trade takes them'),
  'long-flue': published(
    'Roark’s Formulas for Stress and Strain, table 35 case 19a; the knock-down of 3 is common practice',
  ),
  'short-flue': published('Windenburg and Trilling 1934; the knock-down of 3 is common practice'),
  'flue-yield': derived('Hoop stress of a thin tube'),
  'stayed-plate': published('ASME I PG-46'),
  'stayed-strip': derived('A strip fixed along both edges, bending moment p·w²/12'),
  'unstayed-plate': memory('ASME VIII-1 UG-34(c)(2) with C 0.33'),
  'copper-stay': published('Indian Boiler Regulations, regulations 202 and 585'),
  'whitworth-core': derived('Geometry of the Whitworth form'),
  'joint-rating': published('Copper tube joint ratings, table F: saturated steam'),
  'solder-melting': published('Makers’ tables of solders and brazing alloys'),
  'test-profile': published('The test profile chosen; the local code governs'),
  'gauge-window': published('ASME VIII-1 UG-102 practice'),
  'gauge-error': published('EN 837-1:1996, table of classes'),
  'gauge-steady': memory('EN 837-2, steady pressure'),
  'stored-gas': published('ASME PCC-2, energy of compressed gas'),
  'stored-water': derived('Elastic energy of water, bulk modulus 2.2 GPa'),
  'flash-steam': derived('Heat balance on IAPWS R7-97(2012), down to 1 atmosphere'),
  napier: published('Napier’s rule in the SI form of API 520 Part I'),
  'valve-iso': memory('ISO 4126-1, dry saturated steam'),
  'lift-class': published('Indian Boiler Regulations, lift classes'),
  'valve-reseat': published('Indian Boiler Regulations, regulation 295'),
  accumulation: published('UK hobby code as its poster has it; the Indian test under steam allows the same'),
  'steaming-rate': memory(
    'Rates of small boilers by firing; anchors: Indian floor 30, launches 24 and 49 kg/h·m²',
  ),
  'engine-demand': derived(
    'Cylinder volume and specific volume of steam; condensation of 20 to 50 % is common practice',
  ),
  'feed-pump': practice('Slip of a small pump taken at a fifth'),
  'feed-margin': practice('Feed of half as much again as is evaporated'),
  'water-reserve': derived('Water in sight against steam made'),
  'gas-choked': derived('Choked flow of an ideal gas'),
  'gas-orifice': published('Orifice law of gas burners'),
  'heating-values': published('Net calorific values of the commercial gases'),
  'gas-air': derived('Burning of the pure gas, air with 20.95 % of oxygen'),
  wobbe: memory('EN 437, table of test gases'),
  'co-alarm': published('EN 50291-1, alarm times'),
  'co-limits': memory('UK workplace exposure limits EH40'),
  'bar-litres': published('UK hobby code as quoted: under 3 bar·litres, and 3 or more'),
  'pressure-law': memory('Directive 2014/68/EU, annex II table 5 and article 4(3)'),
  'test-intervals': published('UK hobby code of 2006, 11.5, as quoted; the local code governs'),
  'wave-speed': published('Makers’ tables of sound velocity'),
  'scale-loss': published('US Department of Energy, Steam Tip Sheet 7'),
  'scale-acid': derived('2 H₃Cit + 3 CaCO₃'),
  'ba-thread': published('BS 93, British Association threads'),
  haversine: published('Haversine on a sphere of 6,371.0 km'),
  kappa: published('Fleiss and Cohen 1973, quadratic weights'),
} as const satisfies Record<string, Source>;
export type SourceId = keyof typeof sources;
