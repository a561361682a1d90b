const HOURS = 8760;
const HOUR_MS = 3_600_000;
const START = Date.UTC(2031, 0, 1);

/**
 * The invented record of a new folder as CSV: a year of hours of a sunlit rail and of the deck below it, made of a few
 * waves (season, day, and weather that comes and goes) and of nothing measured.
 */
export function starterRecord(): string {
  const rows = ['time,rail [degC],deck [degC]'];
  for (let hour = 0; hour < HOURS; hour++) {
    const time = new Date(START + hour * HOUR_MS).toISOString().slice(0, 16);
    const { rail, deck } = temperaturesAt(hour);
    rows.push(`${time},${rail.toFixed(1)},${deck.toFixed(1)}`);
  }
  return `${rows.join('\n')}\n`;
}

/** Temperatures [°C] at an hour of the year. */
function temperaturesAt(hour: number): { rail: number; deck: number } {
  const day = hour / 24;
  const season = -wave((day - 20) / 365 + 0.25);
  const weather = 3 * wave(day / 5.3) + 2 * wave(day / 11.7 + 0.3);
  const air = 10 + 9 * season + weather + (3 + season) * wave(day - 0.375);
  const height = wave(day - 0.25) * (0.65 + 0.35 * season);
  const clear = 0.55 + 0.25 * wave(day / 3.7 + 0.1) + 0.2 * wave(day / 8.9);
  const sun = Math.max(0, height) * clear;
  const deck = 10 + 9 * wave((day - 30) / 365 - 0.25) + 0.4 * weather + wave(day - 0.5);
  return { rail: air + 26 * sun - (height < 0 ? 2 * clear : 0), deck };
}

/** A sine of whole turns. */
function wave(turns: number): number {
  return Math.sin(2 * Math.PI * turns);
}
