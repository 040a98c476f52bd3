/** How long a coat and a seal last: the public face of this folder. */
export { coatLeft } from './coat-left';
export { coatLife, type CoatInput } from './coat-life';
export { type Life } from './life';
export { monthsInWords } from './life-words';
export { sealLife, type SealInput } from './seal-life';
