/** Care rules, windows, the plan of a home: the public face of this folder. Reminder stages are in `stages.ts`. */
export { planHome } from './plan';
export { monthlyRule } from './rule-build';
export { checkRule } from './rule-check';
export { expandRule } from './rule-expand';
export { nextItem, workState } from './state';
export { visitsOf } from './visits';
export { windowFor } from './window';
