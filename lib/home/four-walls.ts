/** The four walls that a new home starts with, in the order in which one walks around it, clockwise seen from above. */

export type StartingWall = { position: number; name: string; azimuthDeg: number; widthM: number; heightM: number; gableHeightM: number; eaveDepthM: number };

type House = {
  /** Direction that the front faces, degrees clockwise from true north. */
  compassDeg: number;
  frontWidthM: number;
  sideWidthM: number;
  wallHeightM: number;
  gableHeightM: number;
  gablesOn: 'front' | 'sides' | 'none';
  eaveDepthM: number;
};

/** Standing in front and looking at the house, the wall a quarter turn clockwise from the front is on the left. */
const names = ['Front', 'Left side', 'Back', 'Right side'] as const;

export function fourWalls(house: House): StartingWall[] {
  return names.map((name, position) => {
    const along = position % 2 === 0 ? 'front' : 'sides';
    return {
      position,
      name,
      azimuthDeg: (house.compassDeg + 90 * position) % 360,
      widthM: along === 'front' ? house.frontWidthM : house.sideWidthM,
      heightM: house.wallHeightM,
      gableHeightM: house.gablesOn === along ? house.gableHeightM : 0,
      eaveDepthM: house.eaveDepthM,
    };
  });
}
