export { directSunHours, directSunHoursOn, type SunHours, type SunPath, sunPath } from './direct-hours';
export { type Dose, type DoseOptions, sunDose } from './dose';
export { leafOnMonths } from './leaf-months';
export { type Place, sunPosition, type SunPosition } from './position';
export { type DaySpan, type ShadeOrder, shadeOrder, type WallShade } from './shade-order';
export { type Strip, stripsOf } from './strips';
export { coverOf, type Obstruction, type WallCover, type WallFace } from './wall-face';
