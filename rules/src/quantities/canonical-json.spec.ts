import { describe, expect, it } from 'vitest';
import { canonicalJson } from './canonical-json';

describe('canonical JSON', () => {
  it('prints the example of RFC 8785, section 3.2.2', () => {
    const value = {
      numbers: [Number('333333333.33333329'), 1e30, 4.5, 2e-3, 0.000000000000000000000000001],
      string: '\u20ac$\u000F\u000aA\'\u0042\u0022\u005c\\"/',
      literals: [null, true, false],
    };
    expect(canonicalJson(value)).toBe(
      '{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],"string":"€$\\u000f\\nA\'B\\"\\\\\\\\\\"/"}',
    );
  });

  it('leaves out members without a value and does not depend on their order', () => {
    expect(canonicalJson({ b: 1, a: undefined, c: { y: 2, x: 1 } })).toBe(canonicalJson({ c: { x: 1, y: 2 }, b: 1 }));
  });

  it('refuses a number that is not finite', () => {
    expect(() => canonicalJson({ a: Number.NaN })).toThrow(RangeError);
  });
});
