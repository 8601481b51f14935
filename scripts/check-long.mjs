// Runs too long for every check: kills, fuzzing, whole-table walks, load.
import { conclude, step, vitestProject } from './check-steps.mjs';

conclude([step('long tests', () => vitestProject('long'))]);
