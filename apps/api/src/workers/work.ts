import type { LayoutInput, SideInput } from '@hidewright/domain';
import type { ListSheet } from '../papers/list-sheet.ts';
import type { SheetRequest } from './sheet.ts';
import type { WatchedWork } from './watched.ts';

/*
 * What a worker does: each export is one kind of work, and reads in what it needs when it is first asked for.
 */

export const layOut = async (input: LayoutInput) => (await import('./layout.ts')).layOut(input);

export const layOutSide = async (input: SideInput) =>
  (await import('./layout.ts')).layOutSide(input);

export const searchSide = async (work: WatchedWork<SideInput>) =>
  (await import('./layout.ts')).searchSide(work);

export const listSheet = async (sheet: ListSheet) =>
  (await import('../papers/list-sheet.ts')).drawListSheet(sheet);

export const salesSheet = async (request: SheetRequest) =>
  (await import('./sheet.ts')).salesSheet(request);
