import type { LightBasis, Site, Stamp, SunlitBasis, ZonesJob } from '../../model.ts';
import { timeConstant } from '../../temperature/thermal-lag.ts';
import type { UnitSystem } from '../../units.ts';
import { amount } from '../names.ts';
import { shortNumber } from '../number-text.ts';
import { bullet } from './text-layout.ts';

/**
 * What the zones in the sun were reckoned from: first what they share, then what each has of its own.
 */
export function sunLines({ zones, units }: ZonesJob): string[] {
  const sunlit = zones.flatMap(({ name, sunlit }) =>
    sunlit === null ? [] : [{ name, parts: partsOf(sunlit.basis, units) }],
  );
  if (sunlit.length === 0) return [];
  const [first] = sunlit;
  const isShared = (part: string) =>
    sunlit.length > 1 && sunlit.every(({ parts }) => parts.includes(part));
  const shared = first.parts.filter(isShared);
  const lines = sunlit.map(({ name, parts }) => {
    const own = parts.filter((part) => !isShared(part));
    return `${name}: ${own.length === 0 ? 'nothing else' : own.join('; ')}.`;
  });
  const all = shared.length === 0 ? [] : [`All of them: ${shared.join('; ')}.`];
  return [...all, ...lines].map(bullet);
}

function partsOf(basis: SunlitBasis, units: UnitSystem): string[] {
  const { surface, absorptance, emissivity, skyLoss } = basis;
  const named = surface === null ? '' : ` (${surface})`;
  return [
    `air temperature from ${basis.air}`,
    ...lightParts(basis, units),
    `absorptance ${shortNumber(absorptance)}${named}`,
    `emissivity ${shortNumber(emissivity)}, sky loss ${amount(skyLoss, 'irradiance', units)}`,
    filmText(basis, units),
    lagText(basis, units),
  ];
}

function lightParts({ light, tilt }: SunlitBasis, units: UnitSystem): string[] {
  if (light.from === 'surface') return [`sun measured on the surface, ${light.channel}`];
  const { global, direct, diffuse, site, stamp, faces, albedo, sky } = light;
  const given = [global, direct, diffuse].filter((channel) => channel !== null);
  const split = given.length === 1 ? ', parted into direct and diffuse by Erbs' : '';
  const turned = tilt === 0 ? 'level' : `facing ${shortNumber(faces)}°, tilt ${shortNumber(tilt)}°`;
  return [
    `sun from ${given.join(', ')}${split}, at ${placeText(site)}, ${STAMP_TEXT[stamp]}`,
    `surface ${turned}${shadeText(light, units)}`,
    `${sky} sky, ground ${shortNumber(albedo)}`,
  ];
}

const STAMP_TEXT: Readonly<Record<Stamp, string>> = {
  end: 'means of the step that ends at each time',
  start: 'means of the step that starts at each time',
  instant: 'values of the moment',
};

function shadeText(
  { overhang, horizon }: Extract<LightBasis, { from: 'sky' }>,
  units: UnitSystem,
): string {
  const length = (value: number) => amount(value, 'length', units);
  const over =
    overhang === null
      ? ''
      : `, under an overhang ${length(overhang.depth)} deep and ${length(overhang.above)} above`;
  return `${over}${horizon.length === 0 ? '' : ', behind a horizon'}`;
}

function placeText({ latitude, longitude, utcOffset }: Site): string {
  const side = (value: number, [plus, minus]: readonly [string, string]) =>
    `${Number(Math.abs(value).toFixed(2))}° ${value < 0 ? minus : plus}`;
  const clock = `UTC${utcOffset < 0 ? '−' : '+'}${shortNumber(Math.abs(utcOffset))}`;
  return `${side(latitude, ['N', 'S'])} ${side(longitude, ['E', 'W'])} (${clock})`;
}

function filmText({ film }: SunlitBasis, units: UnitSystem): string {
  if (typeof film === 'number') return `film ${amount(film, 'film coefficient', units)}`;
  return `film from the wind ${film.wind} by EN ISO 6946, Annex A (from memory; the wind at a station is mostly more than at a surface, which errs to the cool side)`;
}

function lagText({ lag, film }: SunlitBasis, units: UnitSystem): string {
  if (typeof lag === 'number') {
    return lag === 0
      ? 'no lag: it follows sun and air at once'
      : `time constant ${shortNumber(lag)} h`;
  }
  const mass = amount(lag.mass, 'mass per length', units);
  const perimeter = amount(lag.exposedPerimeter, 'length', units);
  const heat = amount(lag.heatCapacity, 'heat capacity', units);
  const from = `from ${mass}, ${heat} and ${perimeter}`;
  if (typeof film !== 'number') return `time constant ${from} and the film`;
  return `time constant ${shortNumber(timeConstant(lag, film))} h, ${from}`;
}
