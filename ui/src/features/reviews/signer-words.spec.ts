import { describe, expect, it } from 'vitest';
import { awaitsWords, shortHash } from './signer-words';

describe('the words of signing', () => {
  it('names everybody a review still waits for', () => {
    expect(awaitsWords(['veterinarian'])).toBe('veterinarian');
    expect(awaitsWords(['veterinarian', 'compliance'])).toBe('veterinarian and compliance staff');
    expect(awaitsWords([])).toBe('nobody');
  });

  it('shortens a content hash to its ends', () => {
    const hash = `5f2c91ab${'0'.repeat(52)}77e0`;
    expect(shortHash(hash)).toBe('5f2c 91ab … 77e0');
  });
});
