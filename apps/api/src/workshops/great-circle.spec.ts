import { readFileSync } from 'node:fs';
import { join } from 'node:path';

import { greatCircleKm } from './great-circle.js';

interface Row {
  name: string;
  lat1: number;
  lon1: number;
  lat2: number;
  lon2: number;
  metres: number;
}
const { rows } = JSON.parse(
  readFileSync(join(__dirname, '../../test/vectors/great-circle.json'), 'utf8'),
) as { rows: Row[] };

describe('great-circle distance against values of 50 digits', () => {
  it.each(rows)('$name', ({ lat1, lon1, lat2, lon2, metres }) => {
    const km = greatCircleKm({ latitude: lat1, longitude: lon1 }, { latitude: lat2, longitude: lon2 });
    expect(Math.abs(km * 1000 - metres)).toBeLessThan(1e-3);
  });
});
