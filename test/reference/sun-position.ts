/**
 * Published positions of the sun. Angles in degrees, azimuths clockwise from north, times as on the place's standard
 * clock [ms since 1970].
 */

/** I. Reda and A. Andreas, Solar Position Algorithm, NREL/TP-560-34302, Table A5.1: 39.742476 N, 105.1786 W, UTC−7. */
export const SPA_EXAMPLE = {
  site: { latitude: 39.742476, longitude: -105.1786, utcOffset: -7 },
  time: Date.UTC(2003, 9, 17, 12, 30, 30),
  apparentZenith: 50.111622,
  azimuth: 194.340241,
  /** Incidence on a surface of slope 30 turned 10° from south to the east (from memory). */
  surface: { azimuth: 170, tilt: 30 },
  incidence: 25.187,
} as const;

/**
 * Sunrise, transit and sunset by SPA at the same place, from the test data of the open-source library pvlib. SPA's day
 * is that of UTC, so the sunset listed there for 2 August, past midnight in UTC, is that of the evening of 1 August.
 */
export const SPA_DAYS = [
  {
    name: '2 January 2015',
    sunrise: Date.UTC(2015, 0, 2, 7, 21, 55),
    transit: Date.UTC(2015, 0, 2, 12, 4, 45),
    sunset: Date.UTC(2015, 0, 2, 16, 47, 43),
  },
  {
    name: '2 August 2015',
    sunrise: Date.UTC(2015, 7, 2, 5, 0, 27),
    transit: Date.UTC(2015, 7, 2, 12, 6, 58),
    sunset: Date.UTC(2015, 7, 1, 19, 13, 58),
  },
] as const;

/**
 * Duffie and Beckman, Solar Engineering of Thermal Processes, Ex. 1.6.2 (from memory): 43° N, hours from solar noon.
 * The book's declination is that of the day's number, so its angles hold within a degree.
 */
export const TEXTBOOK_POSITIONS = [
  { day: Date.UTC(2015, 1, 13), latitude: 43, fromNoon: -2.5, zenith: 66.5, azimuth: 140 },
  { day: Date.UTC(2015, 6, 1), latitude: 43, fromNoon: 6.5, zenith: 79.6, azimuth: 292 },
] as const;
