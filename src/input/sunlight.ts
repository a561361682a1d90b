import type { LightBasis, Site, Stamp } from '../model.ts';
import { channelNamed } from './channel.ts';
import { type Findings, report } from './findings.ts';
import { readHorizon } from './horizon.ts';
import type { ZONE_KEYS } from './keys.ts';
import { readKeys } from './read-keys.ts';
import type { RecordBasis } from './record-basis.ts';
import { givenText, givenValue, placeOf, type SourceMap } from './source.ts';
import { OVERHANG_KEYS, SUN_KEYS } from './sun-keys.ts';
import type { Values } from './values.ts';

type ZoneValues = Values<typeof ZONE_KEYS>;

/** A zone's keys with what is needed to read them. */
export interface ZoneSource {
  readonly map: SourceMap;
  readonly basis: RecordBasis | null;
  readonly findings: Findings;
  /** Notes a key left at its default. */
  readonly note: (key: string, value: string) => void;
}

/** What the light on a zone's surface comes from; `null` with a fault, which is reported. */
export function readSunlight(values: ZoneValues, source: ZoneSource): LightBasis | null {
  const { basis } = source;
  const sun = readSun(values, source);
  const overhang = readOverhang(values.overhang, source.findings);
  const horizon = readHorizon(values.horizon, source.findings);
  if (sun === null) return null;
  if (sun.on_surface !== null) return readSurfaceLight(sun.on_surface, source);
  const faces = readFaces(values, source);
  const place = basis === null ? null : placeInSky(basis, source);
  if (faces === null || horizon === null || place === null) return null;
  const { global, direct, diffuse } = sun;
  const { albedo, sky } = values;
  return {
    from: 'sky',
    global,
    direct,
    diffuse,
    ...place,
    faces,
    albedo: albedo ?? 0.2,
    sky: sky ?? 'Hay-Davies',
    overhang,
    horizon,
  };
}

type Sun = Values<typeof SUN_KEYS>;

/** The channels of light: as given, or those of the weather file. */
function readSun({ sun }: ZoneValues, source: ZoneSource): Sun | null {
  if (sun === null) return weatherSun(source);
  const { basis, findings } = source;
  const { complete, values } = readKeys(SUN_KEYS, sun, '', findings);
  if (!complete) return null;
  const before = findings.issues.length;
  for (const key of Object.keys(SUN_KEYS)) {
    channelNamed(key, sun, basis?.record ?? null, 'irradiance', findings);
  }
  if (findings.issues.length > before) return null;
  const { global, direct, diffuse, on_surface: onSurface } = values;
  const some = global !== null || direct !== null || diffuse !== null;
  const enough = global !== null || (direct !== null && diffuse !== null);
  if (onSurface === null ? enough : !some) return values;
  const found = sun.entries.size === 0 ? {} : { found: [...sun.entries.keys()].join(', ') };
  const expected =
    'global (with direct and diffuse where there), direct and diffuse, or on_surface alone';
  return report(findings, sun.place, { ...found, expected });
}

/** Where the job names no channel of light: those of the weather file that hold any. */
function weatherSun({ map, basis, findings, note }: ZoneSource): Sun | null {
  if (basis === null) return null;
  const { channels } = basis.record;
  const held = (name: string) =>
    channels.get(name)?.some((value) => !Number.isNaN(value)) ? name : null;
  const sun: Sun = {
    global: held('global'),
    direct: held('direct'),
    diffuse: held('diffuse'),
    on_surface: null,
  };
  const names = Object.values(sun).filter((name) => name !== null);
  const enough = sun.global !== null || names.length === 2;
  if (basis.weather !== null && enough) {
    note('sun', `${names.join(', ')} of the weather file`);
    return sun;
  }
  const expected = 'the channels of irradiance, such as { global: global }';
  return report(findings, placeOf(map, 'sun'), { expected });
}

const SKY_KEYS = ['faces', 'albedo', 'sky', 'overhang', 'horizon'] as const;

/** Light measured on the surface: what would bring it there from the sky has no use. */
function readSurfaceLight(
  channel: string,
  { map, basis, findings }: ZoneSource,
): LightBasis | null {
  for (const key of SKY_KEYS) {
    if (givenValue(map, key) === undefined) continue;
    report(findings, map.entries.get(key)!.place, {
      found: key,
      expected: 'no such key where the light is measured on the surface itself',
    });
  }
  if (basis === null) return null;
  const stamp = basis.stamp ?? reportNoStamp(findings, map);
  return stamp === null ? null : { from: 'surface', channel, stamp };
}

/** Where the surface faces; a level one faces nowhere. */
function readFaces({ faces, tilt }: ZoneValues, { map, findings }: ZoneSource): number | null {
  if (faces !== null) return faces;
  if (tilt === 0 || tilt === 180) return 0;
  const expected = 'where the surface faces, clockwise from north, such as 180 deg for south';
  return report(findings, placeOf(map, 'faces'), { expected });
}

function readOverhang(map: SourceMap | null, findings: Findings) {
  if (map === null) return null;
  const { complete, values } = readKeys(OVERHANG_KEYS, map, '', findings);
  return complete ? values : null;
}

/** Site and stamp, without which nobody knows where the sun stood. */
function placeInSky(
  { site, stamp }: RecordBasis,
  { map, findings }: ZoneSource,
): { site: Site; stamp: Stamp } | null {
  const air = givenText(map, 'air') ?? '';
  if (site === null) {
    report(findings, placeOf(map, 'air'), {
      found: air,
      expected: 'record.site beside a zone in the sun, to know where the sun stands',
    });
  }
  const known = stamp ?? reportNoStamp(findings, map);
  return site === null || known === null ? null : { site, stamp: known };
}

function reportNoStamp(findings: Findings, map: SourceMap): null {
  return report(findings, placeOf(map, 'air'), {
    found: givenText(map, 'air') ?? '',
    expected: 'record.stamp beside a zone in the sun: end, start or instant',
    hint: 'Most stations store the mean of the hour that ends at the time: end.',
  });
}
