import type { Job, LightBasis, Site, SunlitBasis } from '../../model.ts';
import { timeConstant } from '../../temperature/thermal-lag.ts';
import type { UnitSystem } from '../../units.ts';
import { amount } from '../names.ts';
import { shortNumber } from '../number-text.ts';
import { bullet } from './text-layout.ts';

/** What each zone in the sun was reckoned from, one point a zone. */
export function sunLines({ zones, units }: Job): string[] {
  return zones.flatMap(({ name, sunlit }) =>
    sunlit === null ? [] : [bullet(`${name}: ${basisText(sunlit.basis, units)}`)],
  );
}

function basisText(basis: SunlitBasis, units: UnitSystem): string {
  const { surface, absorptance, emissivity, skyLoss, tilt } = basis;
  const named = surface === null ? '' : ` (${surface})`;
  const parts = [
    `air from ${basis.air}`,
    lightText(basis.light, tilt, units),
    `absorptance ${shortNumber(absorptance)}${named}`,
    `emissivity ${shortNumber(emissivity)} and sky loss ${amount(skyLoss, 'irradiance', units)}`,
    filmText(basis, units),
    lagText(basis, units),
  ];
  return `${parts.join('; ')}.`;
}

function lightText(light: LightBasis, tilt: number, units: UnitSystem): string {
  if (light.from === 'surface') return `sun measured on the surface, ${light.channel}`;
  const { global, direct, diffuse, site, faces, albedo, sky, overhang, horizon } = light;
  const given = [global, direct, diffuse].filter((channel) => channel !== null);
  const split = given.length === 1 ? ', parted into direct and diffuse by Erbs' : '';
  const shade = [
    ...(overhang === null
      ? []
      : [
          `under an overhang ${amount(overhang.depth, 'length', units)} deep and ${amount(overhang.above, 'length', units)} above`,
        ]),
    ...(horizon.length === 0 ? [] : ['behind a horizon']),
  ];
  return [
    `sun from ${given.join(', ')}${split}, at ${placeText(site)}`,
    `on a surface that faces ${shortNumber(faces)}°, tilt ${shortNumber(tilt)}°`,
    ...shade,
    `${sky} sky, ground ${shortNumber(albedo)}`,
  ].join(', ');
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
