/** Care rules, windows, the plan of a home: the public face of this folder. */
export { checkRule } from './rule-check';
export { expandRule } from './rule-expand';
export { monthlyRule } from './rule-build';
