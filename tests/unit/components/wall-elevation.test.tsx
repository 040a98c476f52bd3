// @vitest-environment jsdom
import { cleanup, render } from '@testing-library/react';
import { afterEach, expect, it } from 'vitest';
import { WallElevation } from '@/components/drawings/wall-elevation';

afterEach(cleanup);

const rects = (cover?: { depthM: number; heightM: number; share: number }) => {
  const { container } = render(<WallElevation name="Front" widthM={10} heightM={2.5} cover={cover} />);
  return [...container.querySelectorAll('rect')].map((rect) => ['x', 'y', 'width', 'height'].map((name) => Number(rect.getAttribute(name))));
};

it('draws the edge of a porch roof over the middle of the wall, with its shade under it, to scale', () => {
  const drawn = rects({ depthM: 1, heightM: 2, share: 0.5 });
  // 40 to a meter: half of 10 m is 200 wide from 100 on; the underside 80 up; a shade of 1 m is 40 high.
  expect(drawn).toContainEqual([100, -80, 200, 40]);
  expect(drawn).toContainEqual([94, -87, 212, 8]);
  cleanup();
  expect(rects()).toHaveLength(drawn.length - 2);
});
