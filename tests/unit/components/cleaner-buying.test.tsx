import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, test } from 'vitest';
import { CleanerCalculator } from '@/components/takeoff/cleaner-calculator';
import { ShoppingList } from '@/components/takeoff/shopping-list';
import { cleanerStart } from '@/lib/home/cleaner-start';
import { answerCleaner } from '@/lib/schemas/cleaner-form';

const cleaner = (sent = {}) => cleanerStart({ sidingNominalIn: 8, crownHeightM: 0.0254 }, [{ id: 'a', name: 'Front', areaM2: 21.739 }], ['a'], 'us', sent);

describe('cleaner to buy', () => {
  // By hand: 234 ft² × 1.06 ÷ 100 ft²/gal ÷ 5 = 0.496 gal: two quarts.
  test('stands in the page before any script runs, and in the list', () => {
    const { ask, start } = cleaner();
    expect(renderToStaticMarkup(<CleanerCalculator ask={ask} start={start} />)).toContain('2 × 1 qt, $28.00');
    const list = renderToStaticMarkup(<ShoppingList stain={undefined} caulk={undefined} cleaner={answerCleaner(start, ask)} units="us" />);
    expect(list).toContain('Cleaner');
    expect(list).toContain('2 × 1 qt');
  });

  test('a wrong size is marked at its field', () => {
    const html = renderToStaticMarkup(<CleanerCalculator {...cleaner({ 'cleanerContainers.0.size': 'big', 'cleanerContainers.0.price': '9' })} />);
    expect(html).toContain('The size should be a number from');
    expect(html).toContain('Look at the marked fields');
  });
});
