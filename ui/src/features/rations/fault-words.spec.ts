import { expect, it } from 'vitest';
import { faultWithPlace } from './fault-words';

it.each([
  ['lines.5.sharePctDm', 'Line 6: Mend it'],
  ['waters.0.waterAnalysisId', 'Water 1: Mend it'],
  ['cattle.bodyWeightKg', 'Body weight, kg: Mend it'],
  ['waterIntake.temperatureC', 'Water intake: Mend it'],
  ['name', 'Name of the ration: Mend it'],
  ['lines', 'Mend it'],
])('names the field %s in the list of faults', (path, message) => {
  expect(faultWithPlace({ path, message: 'Mend it' })).toEqual({ path, message });
});
