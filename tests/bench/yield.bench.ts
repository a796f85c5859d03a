import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import {
  DomainError,
  findBest,
  nestAnswer,
  nestBounds,
  planRegular,
  readNestCase,
} from '@hidewright/domain';
import { calibrationMs, medianMs } from './timing.ts';
import { printYieldTable, type YieldRow } from './yield-table.ts';

/**
 * How many pieces the yield engine gets from every case of a file, one JSON line per case, and a
 * table beside the file's reference figures. Without a file, the cases kept with the tests.
 */
interface CaseInFile {
  id?: string;
  reference?: Record<string, number>;
}

const runs = { warm: 2, timed: 5 };

function casesOf(file: string): CaseInFile[] {
  if (!existsSync(file)) {
    console.error(`There is no file ${file}. Name a file of cases, or none for those kept here.`);
    process.exit(2);
  }
  const content = JSON.parse(readFileSync(file, 'utf8')) as { cases: CaseInFile[] } | CaseInFile[];
  return Array.isArray(content) ? content : content.cases;
}

function fileFrom(argument: string | undefined): string {
  if (argument !== undefined) {
    const from = process.env['INIT_CWD'] ?? process.cwd();
    return path.resolve(from, argument);
  }
  const beside = path.resolve(process.env['CHECKS_DIR'] ?? '', '..', 'yield', 'public-cases.json');
  const kept = path.resolve(import.meta.dirname, '..', 'fixtures', 'yield-cases.json');
  return process.env['CHECKS_DIR'] !== undefined && existsSync(beside) ? beside : kept;
}

function measure(asked: CaseInFile): YieldRow {
  const { problem } = readNestCase(asked);
  for (let run = 0; run < runs.warm; run += 1) planRegular(problem);
  const regular = medianMs(runs.timed, () => planRegular(problem));
  findBest(problem, { seedPlan: regular.result, budget: 20 });
  const best = medianMs(1, () => findBest(problem, { seedPlan: regular.result }));
  const line = nestAnswer(asked.id ?? null, problem, regular.result, best.result);
  const calibration = calibrationMs();
  console.log(
    JSON.stringify({
      ...line,
      ms: round(regular.ms),
      msBest: round(best.ms),
      calibrated: { regular: round(regular.ms / calibration), best: round(best.ms / calibration) },
    }),
  );
  return {
    id: asked.id ?? '',
    reference: asked.reference ?? {},
    bound: nestBounds(problem),
    line,
    ms: { regular: regular.ms, best: best.ms, calibration },
  };
}

const round = (value: number): number => Math.round(value * 100) / 100;

function measureOrSay(asked: CaseInFile): YieldRow[] {
  try {
    return [measure(asked)];
  } catch (error) {
    if (!(error instanceof DomainError)) throw error;
    console.log(JSON.stringify({ id: asked.id ?? null, placements: [], error: error.message }));
    return [];
  }
}

printYieldTable(casesOf(fileFrom(process.argv[2])).flatMap(measureOrSay));
