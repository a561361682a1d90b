/**
 * Writes the records of the examples anew: the weather of invented places, the same at every run. From the project's
 * top folder:
 *
 *   npm run -s bundle -- data/make-record.ts --outfile=dist/make-record.js && node dist/make-record.js
 */
import { writeFileSync } from 'node:fs';
import { inventedWeather } from './invented-weather.ts';
import { PLACES } from './places.ts';
import { recordText } from './record-text.ts';

for (const { folder, place, form } of PLACES) {
  writeFileSync(`examples/${folder}/record.csv`, recordText(inventedWeather(place), form));
}
