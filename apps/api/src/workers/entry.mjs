import { tsImport } from 'tsx/esm/api';

/** A worker thread cannot start from TypeScript, so this loads it; each export is one kind of work. */
export async function layOut(input) {
  const { layOut: work } = await tsImport('./layout.ts', import.meta.url);
  return work(input);
}

export async function layOutSide(input) {
  const { layOutSide: work } = await tsImport('./layout.ts', import.meta.url);
  return work(input);
}

export async function searchSide(work) {
  const { searchSide: search } = await tsImport('./layout.ts', import.meta.url);
  return search(work);
}

export async function listSheet(sheet) {
  const { drawListSheet } = await tsImport('../papers/list-sheet.ts', import.meta.url);
  return drawListSheet(sheet);
}

export async function salesSheet(request) {
  const { salesSheet: work } = await tsImport('./sheet.ts', import.meta.url);
  return work(request);
}
