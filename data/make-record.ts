/**
 * Writes the records of the examples anew: the weather of invented places, the same at every run. From the project's
 * top folder:
 *
 *   npm run -s bundle -- data/make-record.ts --outfile=dist/make-record.js && node dist/make-record.js
 */
import { writeFileSync } from 'node:fs';
import { epwText } from './epw-text.ts';
import { inventedStation } from './invented-station.ts';
import { inventedWeather } from './invented-weather.ts';
import { PLACES, STATION } from './places.ts';
import { recordText } from './record-text.ts';

for (const { folder, place, form } of PLACES) {
  writeFileSync(`examples/${folder}/record.csv`, recordText(inventedWeather(place), form));
}

const { folder, name, site, place } = STATION;
writeFileSync(`examples/${folder}/weather.epw`, epwText(name, site, inventedStation(place, site)));
