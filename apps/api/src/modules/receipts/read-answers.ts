import type { DeliveryAnswer } from '@hidewright/contract';
import type { EntityManager } from '@mikro-orm/sqlite';

export interface AnswerRow {
  receipt_id: number;
  matter: 'price' | 'short';
  reason: string;
  at: string;
  actor_name: string;
}

/** What was answered about deliveries, as far as it holds: what was answered is what stands now. */
export async function readAnswers(em: EntityManager, receiptIds: number[]): Promise<AnswerRow[]> {
  return em.execute<AnswerRow[]>(
    `SELECT a.* FROM delivery_answer a JOIN receipt r ON r.id = a.receipt_id
     WHERE r.id IN (SELECT value FROM json_each(?))
       AND (a.price_difference = r.price_difference OR a.missing_area_mm2 = r.missing_area_mm2)
     ORDER BY a.id`,
    [JSON.stringify(receiptIds)],
  );
}

/** The last one of a matter. */
export function answerTo(matter: AnswerRow['matter'], answers: AnswerRow[]): DeliveryAnswer | null {
  const last = answers.findLast((answer) => answer.matter === matter);
  return last === undefined ? null : { reason: last.reason, at: last.at, by: last.actor_name };
}
