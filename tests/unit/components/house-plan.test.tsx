// @vitest-environment jsdom
import { cleanup, render, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { HousePlan, type HousePlanWall } from '@/components/drawings/house-plan';
import { drawPlan } from '@/components/drawings/plan-layout';
import { strikes } from '@/components/drawings/plan-sun';

afterEach(cleanup);

const wall = (name: string, azimuthDeg: number, widthM: number, doseKwhM2: number, more: Partial<HousePlanWall> = {}): HousePlanWall => ({
  id: name,
  name,
  azimuthDeg,
  widthM,
  eaveDepthM: 0.5,
  doseKwhM2,
  ...more,
});
const four = (turn = 0) => [wall('South', 180 + turn, 12, 1100), wall('West', 270 + turn, 8, 900), wall('North', turn, 12, 320), wall('East', 90 + turn, 8, 800)];

describe('HousePlan', () => {
  it('draws north up: the south wall lowest, the west wall leftmost', () => {
    const [south, west, north, east] = drawPlan(four()).walls;
    expect(south!.middle.y).toBeGreaterThan(north!.middle.y);
    expect(west!.middle.x).toBeLessThan(east!.middle.x);
    expect(south!.from.y).toBeCloseTo(south!.to.y);
  });

  it('is to scale: 12 m by 8 m', () => {
    const [south, west] = drawPlan(four(17)).walls;
    const length = (drawn: typeof south) => Math.hypot(drawn!.to.x - drawn!.from.x, drawn!.to.y - drawn!.from.y);
    expect(length(south) / length(west)).toBeCloseTo(12 / 8);
  });

  it('draws a wall with more sun thicker, so that the ramp reads without colour', () => {
    const thickness = drawPlan([100, 300, 500, 700, 1000, 1200].map((dose, i) => wall(`w${i}`, i * 60, 8, dose))).walls.map((drawn) => drawn.thickness);
    expect(thickness).toEqual([...thickness].sort((a, b) => a - b));
    expect(new Set(thickness).size).toBe(5);
  });

  it('makes each wall with an address a link that says direction, dose and state', () => {
    render(<HousePlan walls={four().map((one) => ({ ...one, href: `/walls/${one.id}`, state: 'overdue' as const }))} />);
    const links = screen.getAllByRole('link');
    expect(links.map((link) => link.getAttribute('href'))).toEqual(['/walls/South', '/walls/West', '/walls/North', '/walls/East']);
    expect(links[0]).toHaveProperty('tagName', 'a');
    expect(links[0]?.getAttribute('aria-label')).toMatch(/^1\. South, faces south; sun dose 1,100 kWh\/m² a year, much sun; overdue$/);
  });

  it('shows names in a house with room, numbers with a list in one without', () => {
    const { rerender } = render(<HousePlan walls={four()} />);
    expect(screen.queryByRole('list')).toBeNull();
    const narrow = [wall('A long name', 180, 12, 1100), wall('West', 270, 2, 900), wall('Another one', 0, 12, 320), wall('East', 90, 2, 800)];
    rerender(<HousePlan walls={narrow} />);
    const rows = within(screen.getByRole('list')).getAllByRole('listitem').map((item) => item.textContent?.replace(/\s+/g, ' '));
    expect(rows).toEqual(['1 A long name 1,100', '2 West 900', '3 Another one 320', '4 East 800']);
  });

  it('says which walls the sun strikes', () => {
    render(<HousePlan walls={four()} sun={{ azimuthDeg: 200, elevationDeg: 30 }} />);
    const lit = screen.getAllByRole('img', { name: /in the sun now/ }).map((one) => one.getAttribute('aria-label')?.slice(3, 8));
    expect(lit).toEqual(['South', 'West,']);
  });
});

describe('strikes', () => {
  it('is the cosine of incidence on an upright wall', () => {
    expect(strikes({ azimuthDeg: 180, elevationDeg: 60 }, 180)).toBeCloseTo(0.5);
    expect(strikes({ azimuthDeg: 240, elevationDeg: 0.0001 }, 180)).toBeCloseTo(0.5);
  });

  it('is nothing behind the wall and below the horizon', () => {
    expect(strikes({ azimuthDeg: 180, elevationDeg: 20 }, 0)).toBe(0);
    expect(strikes({ azimuthDeg: 180, elevationDeg: -1 }, 180)).toBe(0);
  });
});
