import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { beforeAll, describe, expect, it } from 'vitest';
import { epwText } from '../../data/epw-text.ts';
import { inventedStation } from '../../data/invented-station.ts';
import { STATION } from '../../data/places.ts';
import { readJob } from '../../src/input/job.ts';
import type { Job, Result } from '../../src/model.ts';
import { shortestLife } from '../../src/output/life-text.ts';
import { summary } from '../../src/output/summary/summary.ts';
import { temperaturesText } from '../../src/output/temperatures-text.ts';
import { daysCsv, temperaturesCsv } from '../../src/output/zones-csv.ts';
import { ABSORPTANCES } from '../../src/temperature/absorptance.ts';
import { screen } from '../../src/verdict/screen.ts';
import { zoneFacts } from '../../src/verdict/zone-facts.ts';

/** The example of dark and light rails facing four ways, whole. */
const FOLDER = fileURLToPath(new URL('../../examples/larch-yard', import.meta.url));
const README = readFileSync(new URL('../../README.md', import.meta.url), 'utf8');
let job: Job;
let result: Result;

beforeAll(async () => {
  job = await readJob(FOLDER);
  result = screen(job, { remedies: false });
});

const zone = (name: string) => job.zones.find((one) => one.name === name)!;
const facts = (name: string) => zoneFacts(zone(name), job.axis, null);
const FACES = ['north', 'east', 'south', 'west'];

describe('the weather file', () => {
  it('is what the generator makes', () => {
    const { name, site, place } = STATION;
    const committed = readFileSync(`${FOLDER}/weather.epw`, 'utf8');
    expect(epwText(name, site, inventedStation(place, site)) === committed).toBe(true);
  });

  it('gives place, clock and channels', () => {
    expect(job.weather).toEqual({ place: 'Larch Yard, Nowhere', years: [2031, 2031], setOn: null });
    expect(job.axis.times).toHaveLength(8760);
    expect(result.runs[0].years).toBe(1);
  });
});

describe('colour and orientation', () => {
  it('multiply the gain over the air by the absorptance, on the same light', () => {
    for (const face of FACES) {
      const [dark, light] = [zone(`dark ${face}`), zone(`light ${face}`)];
      expect(light.sunlit!.irradiance).toEqual(dark.sunlit!.irradiance);
      // the time constant is four minutes, so that an hour's gain stands nearly whole
      const gain = (name: string) => facts(name).gain!.largest.value;
      expect(gain(`dark ${face}`) / gain(`light ${face}`)).toBeCloseTo(0.9 / 0.25, 1);
    }
  });

  it('are of the order of EN 1991-1-5:2003, Table 5.2 (from memory)', () => {
    // 45° to 55° N: dark surfaces facing south-west or level 42 °C over the air, light ones 30; facing north-east 4 and 2
    for (const face of ['south', 'west']) {
      const { largest } = facts(`dark ${face}`).gain!;
      expect(largest.value).toBeGreaterThan(30);
      expect(largest.value).toBeLessThan(55);
    }
    expect(facts('dark north').gain!.meanInLight).toBeLessThan(8);
  });

  it('bring an east wall its light before noon and a west wall after', () => {
    const hour = (name: string) => new Date(facts(name).gain!.brightest.time).getUTCHours();
    expect(hour('dark east')).toBeLessThan(11);
    expect(hour('dark west')).toBeGreaterThan(14);
  });

  it('cost the dark sunny sides most of the life of their fasteners', () => {
    const life = (id: string) =>
      Math.min(...result.runs.find(({ run }) => run.id === id)!.connections.map((c) => c.life!));
    expect(life('DS')).toBeLessThan(50);
    expect(life('DW')).toBeLessThan(50);
    expect(life('DN')).toBeGreaterThan(10 * life('DS'));
    for (const face of 'NESW') expect(life(`L${face}`)).toBeGreaterThan(2 * life(`D${face}`));
  });

  it('stand in the README as they come out', () => {
    const lives = (id: string) =>
      shortestLife(result.runs.find(({ run }) => run.id === id)!.connections);
    for (const face of FACES) {
      const id = face[0].toUpperCase();
      expect(README).toContain(`| ${face} | ${lives(`D${id}`)} | ${lives(`L${id}`)} |`);
    }
    for (const [name, { absorptance, source }] of Object.entries(ABSORPTANCES)) {
      expect(README).toContain(`| \`${name}\` | ${absorptance} | ${source} |`);
    }
  });

  it('are said in the summary', () => {
    const text = summary(result).replace(/\s+/g, ' ');
    expect(text).toContain('Weather file of Larch Yard, Nowhere, 2031.');
    expect(text).toContain(
      'All of them: air temperature from air; sun from global, direct, diffuse, at 47.2° N 9.4° E (UTC+1)',
    );
    expect(text).toContain(
      'dark south: surface facing 180°, tilt 90°; absorptance 0.9 (aluminium, dark anodised).',
    );
  });
});

describe('the zones alone', () => {
  it('are told in a text of at most 100 columns', () => {
    const text = temperaturesText(
      job,
      job.zones.map((one) => zoneFacts(one, job.axis, null)),
    );
    expect(Math.max(...text.split('\n').map(({ length }) => length))).toBeLessThanOrEqual(100);
    for (const title of [
      'Each zone',
      'Daily swing',
      'Swings by size, a year',
      'What the sun does',
    ]) {
      expect(text).toContain(title);
    }
  });

  it('stand in tables, a row a sample and a row a day', () => {
    const [header, ...rows] = temperaturesCsv(job).trim().split('\n');
    expect(rows).toHaveLength(8760);
    expect(header).toMatch(
      /^time,dark north \[°C\],dark north air \[°C\],dark north irradiance \[W\/m\^2\],/,
    );
    const cells = rows[4000].split(',');
    expect(Number(cells[1])).toBeCloseTo(zone('dark north').temperature[4000], 3);
    expect(Number(cells[2])).toBeCloseTo(zone('dark north').sunlit!.air[4000], 3);
    const days = daysCsv([facts('dark south')], 'SI')
      .trim()
      .split('\n');
    expect(days).toHaveLength(1 + 365);
  });

  it('have as many swings a year as a count by hand of turning points gives cycles', () => {
    const { temperature } = zone('light south');
    // each cycle of a closed loop has one local maximum: ASTM E1049 counts them all
    const n = temperature.length;
    let maxima = 0;
    for (let i = 0; i < n; i++) {
      const here = temperature[i];
      if (here > temperature[(i + n - 1) % n] && here >= temperature[(i + 1) % n]) maxima++;
    }
    const { ranges, years } = facts('light south');
    expect(years).toBe(1);
    expect(Math.abs(ranges.length - maxima)).toBeLessThanOrEqual(3);
  });
});
