import { tsImport } from 'tsx/esm/api';

/** A worker thread cannot start from TypeScript, so this loads it; in the built program, the work itself stands here. */
export const { layOut, layOutSide, searchSide, listSheet, salesSheet } = await tsImport(
  './work.ts',
  import.meta.url,
);
