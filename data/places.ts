import type { Place } from './invented-weather.ts';
import type { RecordForm } from './record-text.ts';

/** The invented places of the examples, and the form of their records. */
export const PLACES: readonly { folder: string; place: Place; form: RecordForm }[] = [
  {
    folder: 'skerry-landing',
    place: {
      seed: 303,
      start: Date.UTC(2031, 0, 1),
      hours: 365 * 24,
      latitude: 44,
      air: [-13, 32],
      sides: [
        { name: 'rail_south', azimuth: 0, range: [-17, 55] },
        { name: 'rail_east', azimuth: -90, range: [-17, 54] },
      ],
      structure: { name: 'deck', range: [8, 20] },
    },
    form: {
      unit: 'degC',
      // the logger's two bad days: two hours that are filled, eight that are bridged but not counted as covered
      outages: [
        { channel: 'rail_south', from: Date.UTC(2031, 2, 14, 21), hours: 2 },
        { channel: 'rail_east', from: Date.UTC(2031, 9, 3, 1), hours: 8 },
      ],
    },
  },
  {
    folder: 'tin-hollow',
    place: {
      seed: 8,
      start: Date.UTC(2031, 3, 1),
      hours: 90 * 24,
      latitude: 38,
      air: [1, 36],
      sides: [{ name: 'coping_west', azimuth: 90, range: [-2, 62] }],
      structure: null,
    },
    form: { unit: 'degF', outages: [] },
  },
];

/** The invented weather station of an example, and where its sun stands. */
export const STATION = {
  folder: 'larch-yard',
  name: 'Larch Yard',
  site: { latitude: 47.2, longitude: 9.4, utcOffset: 1 },
  place: {
    seed: 47,
    start: Date.UTC(2031, 0, 1, 1),
    hours: 365 * 24,
    latitude: 47.2,
    air: [-14, 33],
    sides: [],
    structure: null,
  },
} as const satisfies { place: Place; [key: string]: unknown };
