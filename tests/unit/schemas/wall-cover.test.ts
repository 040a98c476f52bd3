import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { coverValues } from '@/lib/home/form-values';
import { wallSchema } from '@/lib/schemas/wall';
import { coverShares } from '@/lib/schemas/wall-cover';
import { wallForm } from '@/tests/fixtures/home-forms';

const read = (values: Record<string, string>) => wallSchema.safeParse({ ...wallForm(values), stained: { notKnown: 'on' }, caulked: { notKnown: 'on' } });
const faults = (values: Record<string, string>) => {
  const { error } = read(values);
  return Object.fromEntries((error?.issues ?? []).map(({ path, message }) => [path.join('.'), message]));
};
const porch = { cover: 'porch', coverDepth: '8', coverHeight: '7 ft 6 in', coverShare: '0.5', corners: '1', pipes: '6' };

describe('a porch roof or deck in the wall form', () => {
  it('is read in the person’s units', () => {
    expect(read(porch).data).toMatchObject({ cover: 'porch', coverDepthM: expect.closeTo(2.4384, 6) as number, coverHeightM: expect.closeTo(2.286, 6) as number, coverShare: 0.5, corners: 1, pipes: 6 });
    expect(read({ ...porch, units: 'metric', width: '9', height: '3', eaveDepth: '0.45', coverDepth: '2.4', coverHeight: '220 cm' }).data).toMatchObject({ coverDepthM: 2.4, coverHeightM: expect.closeTo(2.2, 9) as number });
  });

  it('needs a depth and a height', () => {
    expect(faults({ ...porch, coverDepth: '', coverHeight: ' ' })).toEqual({
      coverDepth: 'Say how deep it is: from the wall out to its edge.',
      coverHeight: 'Say how high its underside is above the wall’s foot.',
    });
    expect(faults({ ...porch, coverDepth: 'deep', coverShare: '2' })).toEqual({
      coverDepth: expect.stringContaining('could not be read') as string,
      coverShare: 'Choose how much of the width is under it.',
    });
  });

  it('has its underside between 1 m and 1 m above the top of the wall, whatever the wall', () => {
    // The wall is 9 ft high: 2.7432 m; 3.7432 m are 12 ft 3.37 in.
    expect(faults({ ...porch, coverHeight: '12 ft 3 in' })).toEqual({});
    expect(faults({ ...porch, coverHeight: '12 ft 4 in' })).toEqual({ coverHeight: 'The height of its underside should be between 3.3 ft and 12.3 ft.' });
    expect(faults({ ...porch, coverHeight: '3 ft' })).toHaveProperty('coverHeight');
    // A height of the wall that cannot be read is its own fault, not one of the cover.
    expect(Object.keys(faults({ ...porch, height: 'high', coverHeight: '14' }))).toEqual(['height']);
  });

  it('keeps what was entered while there is none, and faults none of it', () => {
    expect(read({ ...porch, cover: 'none', coverHeight: '20' }).data).toMatchObject({ cover: 'none', coverDepthM: expect.closeTo(2.4384, 6) as number, coverHeightM: expect.closeTo(6.096, 6) as number, coverShare: 0.5 });
    expect(read({ ...porch, cover: 'none', coverDepth: 'deep', coverHeight: '9e9' }).data).toMatchObject({ cover: 'none', coverDepthM: 0, coverHeightM: 0 });
  });

  it('is nothing, with two corners and no pipes, where a form does not ask', () => {
    expect(read({}).data).toMatchObject({ cover: 'none', coverDepthM: 0, coverHeightM: 0, coverShare: 1, corners: 2, pipes: 0 });
  });

  it('takes whole corners up to two, and pipes from none', () => {
    expect(faults({ corners: '3', pipes: '-1' })).toEqual({ corners: 'A wall has at most two corners.', pipes: 'None is 0.' });
    expect(Object.keys(faults({ corners: '1.5', pipes: 'many' })).sort()).toEqual(['corners', 'pipes']);
    expect(read({ corners: '0', pipes: '12' }).data).toMatchObject({ corners: 0, pipes: 12 });
  });

  it('comes back from what is stored as it was entered', () => {
    fc.assert(
      fc.property(fc.constantFrom('none', 'porch', 'deck'), fc.integer({ min: 12, max: 200 }), fc.integer({ min: 40, max: 147 }), fc.constantFrom(...coverShares), fc.constantFrom('us', 'metric'), (cover, depthIn, heightIn, share, units) => {
        const stored = { cover, coverDepthM: depthIn * 0.0254, coverHeightM: heightIn * 0.0254, coverShare: Number(share) };
        const again = read({ units, width: units === 'us' ? '40' : '12', height: units === 'us' ? '9' : '2.7432', eaveDepth: '0', ...coverValues(stored, units) }).data;
        // Metres in forms have three decimals: half a millimetre.
        expect(again).toMatchObject({ cover, coverShare: stored.coverShare });
        expect(Math.abs((again?.coverDepthM ?? NaN) - stored.coverDepthM)).toBeLessThanOrEqual(0.0005);
        expect(Math.abs((again?.coverHeightM ?? NaN) - stored.coverHeightM)).toBeLessThanOrEqual(0.0005);
      }),
    );
    expect(coverValues({ cover: 'deck', coverDepthM: 0, coverHeightM: 0, coverShare: 0.6 }, 'us')).toEqual({ cover: 'deck', coverDepth: '', coverHeight: '', coverShare: '0.5' });
  });
});
