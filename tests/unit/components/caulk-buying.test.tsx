import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, test } from 'vitest';
import { CaulkCalculator } from '@/components/takeoff/caulk-calculator';
import { ShoppingList } from '@/components/takeoff/shopping-list';
import { caulkStart } from '@/lib/home/caulk-start';

const foot = 0.3048;
const front = { wall: { id: 'a', name: 'Front', widthM: 30 * foot, heightM: 9 * foot, gableHeightM: 0, corners: 2, pipes: 0 }, openings: [{ widthM: 3 * foot, heightM: 4 * foot, count: 3 }] };
const caulk = (units: 'us' | 'metric', sent = {}) => caulkStart({ sidingNominalIn: 8 }, [front], ['a'], units, sent);

describe('caulk to buy', () => {
  // By hand: 42 ft round windows, 18 ft of corners, 17 × 6.625 in of butt joints: 69.4 ft; a tenth of waste: 76.3 ft of 3/8 in rod.
  test('stands in the page before any script runs', () => {
    const html = renderToStaticMarkup(<CaulkCalculator {...caulk('us')} />);
    expect(html).toContain('69.4 ft');
    expect(html).toContain('76.3 ft of 0.375 in');
  });

  test('a width that is no joint is marked, in the reader’s units', () => {
    expect(renderToStaticMarkup(<CaulkCalculator {...caulk('metric', { caulkWidth: '3' })} />)).toContain('A joint is 6.35 to 25.4 mm wide.');
  });

  test('the list names caulk and rod, and no stain where none was chosen', () => {
    const html = renderToStaticMarkup(<ShoppingList stain={undefined} caulk={caulk('us').first} units="us" />);
    expect(html).toContain('Backer rod');
    expect(html).not.toContain('Stain');
  });
});
