import type { KeyTable } from './keys.ts';

/** A zone whose temperature is reckoned from sun and air. */
export const SUNLIT_ZONE_KEYS = {
  air: {
    kind: 'name',
    needs: 'this, `column` or `constant`',
    example: 'air',
    meaning:
      'Channel of air temperature: the zone is a member in air and sun. The keys below are for such zones.',
  },
  sun: {
    kind: 'map',
    needs: 'the sun of the weather file where not given; else required with `air`',
    example: '{ global: global }',
    meaning: 'Channels of irradiance.',
  },
  faces: {
    kind: 'angle',
    from: 0,
    to: 360,
    needs: 'required with `air`, unless `tilt` is 0 or the sun is measured on the surface',
    example: '180 deg',
    meaning: 'Where the surface faces, clockwise from north: 90 is east, 180 south.',
  },
  tilt: {
    kind: 'angle',
    from: 0,
    to: 180,
    needs: '90 deg where not given',
    example: '30 deg',
    meaning: 'Tilt of the surface: 0 faces up, 90 stands upright, 180 faces down.',
  },
  albedo: {
    kind: 'number',
    from: 0,
    to: 1,
    needs: '0.2 where not given',
    example: '0.2',
    meaning: 'Share of the light that the ground before it throws back.',
  },
  sky: {
    kind: 'choice',
    choices: ['Hay-Davies', 'isotropic'],
    needs: 'Hay-Davies where not given',
    example: 'isotropic',
    meaning: 'Whether the sky is brighter round the sun or equally bright all over.',
  },
  overhang: {
    kind: 'map',
    example: '{ depth: 300 mm, above: 600 mm }',
    meaning: 'A level ledge of endless length over the member, which hides the sun.',
  },
  horizon: {
    kind: 'list',
    example: '[[90 deg, 10 deg], [140 deg, 25 deg]]',
    meaning:
      'What hides the sun far off: pairs of azimuth and altitude, azimuths rising; straight between them and round the circle.',
  },
  absorptance: {
    kind: 'text',
    needs: 'required with `air`',
    example: '0.9',
    meaning:
      "Share of the sun's light that the surface takes in, or the name of a surface in the table below.",
  },
  emissivity: {
    kind: 'number',
    from: 0,
    to: 1,
    needs: '0.9 where not given',
    example: '0.9',
    meaning: 'Emissivity of the surface.',
  },
  sky_loss: {
    kind: 'irradiance',
    from: 0,
    to: 300,
    needs: '63 W/m^2 for a level surface down to 0 for an upright one where not given',
    example: '63 W/m^2',
    meaning: 'ΔR: what a black surface as warm as the air would lose to sky and surroundings.',
  },
  film: {
    kind: 'film coefficient',
    from: 1,
    to: 500,
    needs: '17 W/m^2/K where neither it nor `wind` is given',
    example: '17 W/m^2/K',
    meaning: 'Film coefficient of the surface, convection and radiation together.',
  },
  wind: {
    kind: 'name',
    needs: 'instead of `film`',
    example: 'wind',
    meaning:
      'Channel of wind speed that the film coefficient follows. The wind at a surface is mostly less than at a station: this errs to the cool side.',
  },
  time_constant: {
    kind: 'hours',
    from: 0,
    to: 1e4,
    needs: '0 h where neither it nor `mass` is given',
    example: '0.5 h',
    meaning: 'How slowly the member follows sun and air.',
  },
  mass: {
    kind: 'mass per length',
    over: 0,
    to: 1e6,
    needs: 'instead of `time_constant`, with the next two',
    example: '1.2 kg/m',
    meaning: 'Mass of the member.',
  },
  heat_capacity: {
    kind: 'heat capacity',
    over: 0,
    to: 1e5,
    needs: 'with `mass`',
    example: '900 J/kg/K',
    meaning: 'Specific heat capacity of its material.',
  },
  exposed_perimeter: {
    kind: 'length',
    over: 0,
    to: 1e6,
    needs: 'with `mass`',
    example: '200 mm',
    meaning: 'Perimeter of its section that trades heat with the air.',
  },
} as const satisfies KeyTable;

export const SUN_KEYS = {
  global: {
    kind: 'name',
    needs: 'this, or `direct` and `diffuse`, or `on_surface`',
    example: 'global',
    meaning: 'Channel of the global irradiance on the horizontal.',
  },
  direct: {
    kind: 'name',
    needs: 'reckoned from the others where not given',
    example: 'direct',
    meaning: 'Channel of the direct irradiance on a surface that faces the sun.',
  },
  diffuse: {
    kind: 'name',
    needs: 'reckoned from the others where not given',
    example: 'diffuse',
    meaning: 'Channel of the diffuse irradiance on the horizontal.',
  },
  on_surface: {
    kind: 'name',
    needs: 'instead of the others',
    example: 'wall_south',
    meaning: 'Channel of irradiance measured on the surface itself.',
  },
} as const satisfies KeyTable;

export const OVERHANG_KEYS = {
  depth: {
    kind: 'length',
    over: 0,
    to: 1e6,
    required: true,
    example: '300 mm',
    meaning: 'How far it stands out from the surface.',
  },
  above: {
    kind: 'length',
    from: 0,
    to: 1e6,
    required: true,
    example: '600 mm',
    meaning: 'How far it is above the member.',
  },
} as const satisfies KeyTable;

export const SITE_KEYS = {
  latitude: {
    kind: 'angle',
    from: -90,
    to: 90,
    required: true,
    example: '45.2 deg',
    meaning: 'North positive.',
  },
  longitude: {
    kind: 'angle',
    from: -180,
    to: 180,
    required: true,
    example: '-7.5 deg',
    meaning: 'East positive.',
  },
  utc_offset: {
    kind: 'hours',
    from: -12,
    to: 14,
    needs: 'required unless the times of the record name theirs',
    example: '1 h',
    meaning: "How far the record's clock runs ahead of UTC, the same all year.",
  },
} as const satisfies KeyTable;

export const WARMING_KEYS = {
  add: {
    kind: 'temperature difference',
    from: -50,
    to: 50,
    default: '0 K',
    example: '2 K',
    meaning: 'Added to every temperature of every zone that is not constant.',
  },
  daily_swing: {
    kind: 'number',
    from: 0,
    to: 10,
    default: '1',
    example: '1.1',
    meaning: 'Multiplies the swing about the mean of the 24 h around each sample.',
  },
} as const satisfies KeyTable;
