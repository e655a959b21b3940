import { describe, expect, it } from 'vitest';
import { fieldWords } from '../../lib/explain/fieldWords.ts';
import { shelved } from '../../lib/explain/shelf.ts';

describe('fieldWords(field)', () => {
  it('says a field in words, its unit apart', () => {
    expect(fieldWords('leastStemM')).toEqual({ words: 'least stem', unit: 'm' });
    expect(fieldWords('strandAreaMm2')).toEqual({ words: 'strand area', unit: 'mm2' });
    expect(fieldWords('strandKgPerM3')).toEqual({ words: 'strand', unit: 'kg/m3' });
    expect(fieldWords('shorteningPerM')).toEqual({ words: 'shortening', unit: 'm/m' });
    expect(fieldWords('unknownSpeedKmh')).toEqual({ words: 'unknown speed', unit: 'km/h' });
  });

  it('says standards and forms by the names the trade knows, and a symbol by what it stands for', () => {
    expect(fieldWords('hl93').words).toBe('to AASHTO HL-93');
    expect(fieldWords('composite-i').words).toBe('composite I-girders');
    expect(fieldWords('gammaM')).toEqual({ words: 'partial factor of resistance', unit: '' });
  });
});

describe('shelved(path)', () => {
  it('counts the entries of a list from one and takes the unit of what holds them', () => {
    expect(shelved('composite-i/haunch/ratios/0')?.label).toBe('haunch, ratios, no. 1');
    expect(shelved('concrete-box/strandAreaMm2/lm1')).toMatchObject({
      label: 'strand area, to EN 1991-2, LM1',
      unit: 'mm2',
    });
  });
});
