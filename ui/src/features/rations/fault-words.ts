import type { Fault } from '../../lib/form/faults-to-form';
import { cattleLabels } from './conflict-words';

function placeOf(path: string): string | null {
  const [root, key] = path.split('.');
  if (key === undefined) return root === 'name' ? 'Name of the ration' : null;
  if (root === 'lines') return `Line ${Number(key) + 1}`;
  if (root === 'waters') return `Water ${Number(key) + 1}`;
  if (root === 'waterIntake') return 'Water intake';
  return Object.entries(cattleLabels).find(([name]) => name === key)?.[1] ?? null;
}

/** A fault with the field it is in, so that a list of faults can be read on its own. */
export function faultWithPlace(fault: Fault): Fault {
  const place = placeOf(fault.path);
  return place === null ? fault : { path: fault.path, message: `${place}: ${fault.message}` };
}
