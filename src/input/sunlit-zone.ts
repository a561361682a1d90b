import type { LightBasis, SunlitBasis, Zone } from '../model.ts';
import { ABSORPTANCES } from '../temperature/absorptance.ts';
import { ASHRAE_FILM } from '../temperature/film-coefficient.ts';
import { skyLoss } from '../temperature/sky-loss.ts';
import { sunlitZone } from '../temperature/sunlit-zone.ts';
import { readNumber } from '../units.ts';
import { channelNamed } from './channel.ts';
import { type Findings, report } from './findings.ts';
import type { ZONE_KEYS } from './keys.ts';
import { nearestName } from './nearest-name.ts';
import type { RecordBasis } from './record-basis.ts';
import { givenText, givenValue, placeOf, type SourceMap } from './source.ts';
import { readSunlight, type ZoneSource } from './sunlight.ts';
import type { Values } from './values.ts';

type ZoneValues = Values<typeof ZONE_KEYS>;

/**
 * A zone reckoned from sun and air.
 *
 * @param values its keys, `air` among them
 * @param map where they stand
 * @param basis `null` where the record itself has faults: then only the keys are checked
 * @returns `null` with a fault, which is reported
 */
export function readSunlitZone(
  name: string,
  values: ZoneValues,
  map: SourceMap,
  basis: RecordBasis | null,
  findings: Findings,
): Zone | null {
  const before = findings.issues.length;
  const source: ZoneSource = {
    map,
    basis,
    findings,
    note: (key, value) => findings.defaults.push({ key: `zones ${name}: ${key}`, value }),
  };
  const absorptance = readAbsorptance(source);
  const light = readSunlight(values, source);
  const film = readFilm(values, source);
  const lag = readLag(values, source);
  const air = channelNamed('air', map, basis?.record ?? null, 'temperature', findings);
  if (findings.issues.length > before) return null;
  if (basis === null || light === null || absorptance === null || film === null) return null;
  const tilt = values.tilt ?? 90;
  const settled: SunlitBasis = {
    air: air ?? '',
    light,
    tilt,
    ...absorptance,
    emissivity: values.emissivity ?? 0.9,
    skyLoss: values.sky_loss ?? skyLoss(tilt),
    film,
    lag: lag ?? 0,
  };
  noteRest(values, settled, source);
  const { record, axis, fillUpTo } = basis;
  const sun = light.from === 'sky' ? basis.sun() : null;
  return sunlitZone(name, settled, { axis, channels: record.channels, fillUpTo, sun });
}

/** Absorptance as a number or by the name of a surface. */
function readAbsorptance({
  map,
  findings,
}: ZoneSource): Pick<SunlitBasis, 'absorptance' | 'surface'> | null {
  const text = givenText(map, 'absorptance');
  const place = placeOf(map, 'absorptance');
  const expected = 'a number from 0 to 1 or the name of a surface, such as 0.9 or dark surface';
  if (text === undefined) return report(findings, place, { expected });
  const named = ABSORPTANCES[text];
  if (named !== undefined) return { absorptance: named.absorptance, surface: text };
  const number = readNumber(text);
  if (number !== null && number >= 0 && number <= 1) return { absorptance: number, surface: null };
  const nearest = nearestName(text, Object.keys(ABSORPTANCES));
  return report(findings, place, {
    found: text,
    expected,
    ...(nearest === undefined ? {} : { nearest }),
  });
}

/** The film coefficient: as given, from the wind, or that of the standard tables. */
function readFilm(
  { film, wind }: ZoneValues,
  { map, basis, findings, note }: ZoneSource,
): SunlitBasis['film'] | null {
  if (film !== null && wind !== null) {
    return report(findings, placeOf(map, 'wind'), { found: wind, expected: 'either film or wind' });
  }
  if (wind !== null) {
    channelNamed('wind', map, basis?.record ?? null, 'speed', findings);
    return { wind };
  }
  if (film === null) note('film', `${ASHRAE_FILM} W/m^2/K`);
  return film ?? ASHRAE_FILM;
}

const STORE = ['mass', 'heat_capacity', 'exposed_perimeter'] as const;

/** The time constant, or what it follows from. */
function readLag(
  values: ZoneValues,
  { map, findings, note }: ZoneSource,
): SunlitBasis['lag'] | null {
  const { mass, heat_capacity, exposed_perimeter, time_constant } = values;
  const given = STORE.filter((key) => givenValue(map, key) !== undefined);
  if (given.length === 0) {
    if (time_constant === null) note('time_constant', '0 h, so it follows sun and air at once');
    return time_constant ?? 0;
  }
  if (time_constant !== null) {
    return report(findings, placeOf(map, 'time_constant'), {
      found: givenText(map, 'time_constant') ?? '',
      expected: `either time_constant or ${STORE.join(', ')}`,
    });
  }
  if (mass !== null && heat_capacity !== null && exposed_perimeter !== null) {
    return { mass, heatCapacity: heat_capacity, exposedPerimeter: exposed_perimeter };
  }
  for (const key of STORE) {
    if (given.includes(key)) continue;
    report(findings, placeOf(map, key), { expected: `a value, since ${given[0]} is given` });
  }
  return null;
}

/** Notes what was left at its default beside film and lag. */
function noteRest(
  values: ZoneValues,
  { light, skyLoss: loss }: SunlitBasis,
  { note }: ZoneSource,
): void {
  if (values.tilt === null) note('tilt', '90 deg');
  if (values.emissivity === null) note('emissivity', '0.9');
  if (values.sky_loss === null) note('sky_loss', `${Number(loss.toPrecision(3))} W/m^2`);
  noteLight(values, light, note);
}

function noteLight(values: ZoneValues, light: LightBasis, note: ZoneSource['note']): void {
  if (light.from === 'surface') return;
  if (values.albedo === null) note('albedo', '0.2');
  if (values.sky === null) note('sky', 'Hay-Davies');
}
