import { screen, type ScreeningRequest } from '@brimgate/rules';
import { aComposition, aLine, aRequest } from '@brimgate/rules/testing';
import { describe, expect, it } from 'vitest';
import { verdictWords } from './verdict-words';

const wordsOf = (request: ScreeningRequest) => verdictWords(screen(request), request);

/** Grain and a tenth of roughage; water of 40 L into 10 kg of dry matter. */
const withSulfate = (sulfateMgPerL: number) =>
  aRequest({ waters: [{ name: 'north well', sharePct: 100, sulfate: { value: sulfateMgPerL, as: 'SO4' } }] });

describe('the verdict in words', () => {
  it('never says safe or clear, and says that nobody signs', () => {
    const words = wordsOf(aRequest());
    expect(words.verdict).toBe('Within every limit that somebody would have to sign for.');
    expect(words.whoSigns).toBe('Nobody has to sign.');
    expect(words.isLoud).toBe(false);
    expect(JSON.stringify(words)).not.toMatch(/safe|clear/i);
  });

  it('names value, limit and the nutritionist above the class maximum', () => {
    // 40 L × 900 mg/L = 36 g sulfate = 12.0 g sulfur in 10 kg = 0.12 %; with 0.20 of the feed 0.32
    const words = wordsOf(withSulfate(900));
    expect(words.verdict).toBe('Over on total sulfur: 0.32 % of DM, limit 0.30.');
    expect(words.whoSigns).toBe('The nutritionist gives a reason.');
    expect(words.isLoud).toBe(true);
  });

  it('names the grade above which the veterinarian signs', () => {
    // 40 L × 1800 mg/L = 72 g sulfate = 24.0 g sulfur = 0.24 %; with 0.20 of the feed 0.44
    expect(wordsOf(withSulfate(1800)).whoSigns).toBe('Above 0.40 the veterinarian signs.');
    // 40 L × 2500 mg/L = 100 g sulfate = 33.4 g sulfur = 0.33 %; with 0.20 of the feed 0.53
    expect(wordsOf(withSulfate(2500)).whoSigns).toBe('Above 0.50 the veterinarian signs, every time.');
  });

  it('says what is not determined, what is missing for it, and that it asks for the veterinarian', () => {
    const composition = { ...aComposition() };
    delete composition.sulfurPctDm;
    const request = aRequest({
      lines: [{ feedstuff: 'corn silage', sharePctDm: 20, composition }, aLine('grain', 80)],
    });
    const words = wordsOf(request);
    expect(words.status).toBe('undetermined');
    expect(words.verdict).toBe('Not determined: total sulfur.');
    expect(words.whoSigns).toBe('The veterinarian signs.');
    expect(words.besides).toContain('total sulfur (missing: sulfur of corn silage)');
  });

  it('names what is only a notice apart from the verdict', () => {
    const words = wordsOf(aRequest({ lines: [aLine('grain', 100, { calciumPctDm: 0.1 })] }));
    expect(words.status).toBe('within');
    expect(words.besides).toContain('Over, as a notice only:');
    expect(words.besides).toContain('calcium to phosphorus');
  });
});
