import type { Work } from '../../work.ts';
import { StoredFile } from './stored-file.entity.ts';

/** What is known of a file whose bytes the file store keeps. */
export interface KeptFile {
  hash: string;
  name: string;
  type: string;
  size: number;
}

/** Notes a file in the transaction that makes use of it; the same bytes are noted once. */
export async function noteFile(work: Work, file: KeptFile): Promise<void> {
  if ((await work.em.findOne(StoredFile, { hash: file.hash })) !== null) return;
  work.em.create(StoredFile, { ...file, createdAt: work.now.toISOString() });
  await work.em.flush();
}
