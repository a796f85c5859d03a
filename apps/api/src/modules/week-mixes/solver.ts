import { lpText, readLpAnswer, type LinearSolver } from '@hidewright/domain';
import highs from 'highs';

// Its types describe the CommonJS build, whose loader is one step further in.
const load = highs as unknown as typeof highs.default;
let loaded: Promise<LinearSolver> | undefined;

/** Nothing that a week can hold takes it longer than a few milliseconds. */
const limits = { output_flag: false, time_limit: 5 };

/** HiGHS, compiled to WebAssembly: loaded when the first week is asked for, and then kept. */
export function linearSolver(): Promise<LinearSolver> {
  loaded ??= load().then(
    (solver) => (programme) => readLpAnswer(programme, solver.solve(lpText(programme), limits)),
  );
  return loaded;
}
