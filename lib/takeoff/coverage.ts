import { type Texture } from '@/lib/schemas/vocabulary';

/**
 * Stain coverage of one coat, ft² per US gallon. Source: Wood Handbook, FPL-GTR-190 (2010), p. 16-20, oil semitransparent stain:
 * smooth wood 200–400, saw-textured or weathered wood 100–200. The value on the product's label always wins.
 */
export const coverageFt2PerGal: Record<Texture, { low: number; high: number }> = {
  smooth: { low: 200, high: 400 },
  'saw-textured': { low: 100, high: 200 },
};

export const coverageSource = 'Wood Handbook, FPL-GTR-190 (USDA Forest Products Laboratory, 2010), p. 16-20';
