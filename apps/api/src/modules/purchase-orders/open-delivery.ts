import { invalid, wrongState } from '../../http/problem.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { findPurchaseOrder } from './draft-purchase-order.ts';
import { noteAwaited } from './note-awaited.ts';
import { PurchaseLine } from './purchase-line.entity.ts';
import type { PurchaseOrder } from './purchase-order.entity.ts';
import { receivedMeanwhile } from './received-meanwhile.ts';

type Came = { purchaseLineId: number | null } & ({ leatherId: number } | { hardwareId: number });

/** A delivery that is being taken in: the order that it fills, line by line, or none. */
export class OpenDelivery {
  readonly #work: Work;
  readonly #order: PurchaseOrder | null;
  readonly #lines: PurchaseLine[];
  /** Whether whoever receives has seen what came before. */
  readonly #seen: boolean;
  readonly #filled = new Set<number>();

  private constructor(
    work: Work,
    order: PurchaseOrder | null,
    lines: PurchaseLine[],
    seen: boolean,
  ) {
    this.#work = work;
    this.#order = order;
    this.#lines = lines;
    this.#seen = seen;
  }

  /**
   * @param receiptsSeen how many deliveries had come when the order was looked at; null where nobody says
   * @throws {Problem} 404, or 409 when the order awaits no delivery, or somebody else has received of it since
   */
  static async begin(
    work: Work,
    orderId: number | null,
    receiptsSeen: number | null,
  ): Promise<OpenDelivery> {
    if (orderId === null) return new OpenDelivery(work, null, [], true);
    const order = await findPurchaseOrder(work, orderId);
    if (receiptsSeen !== null && receiptsSeen !== order.receipts)
      throw await receivedMeanwhile(work, order);
    if (order.state !== 'sent' && order.state !== 'part received') throw awaitsNothing(order);
    return new OpenDelivery(
      work,
      order,
      await work.em.find(PurchaseLine, { purchaseOrderId: orderId }),
      receiptsSeen !== null,
    );
  }

  get order(): PurchaseOrder | null {
    return this.#order;
  }

  get orderId(): number | null {
    return this.#order?.id ?? null;
  }

  /**
   * Counts what came towards the line that ordered it, if it names one: of leather the area that is paid for, which is
   * the marked one where there is one, since what is short of it is claimed and not awaited. More than was ordered is
   * received all the same and told as over; only a line that was complete already takes nothing from somebody who may
   * not have seen it.
   */
  fill(came: Came, quantity: number, field: string): PurchaseLine | null {
    if (came.purchaseLineId === null) return null;
    const line = this.#lines.find(({ id }) => id === came.purchaseLineId);
    const matches =
      'leatherId' in came
        ? came.leatherId === line?.leatherId
        : came.hardwareId === line?.hardwareId;
    if (line !== undefined && line.service !== null) {
      return this.#fillService(line, { came, quantity, field });
    }
    if (line === undefined || !matches) {
      throw invalid([
        {
          field: `${field}.purchaseLineId`,
          message: 'Choose the line of this order that it belongs to.',
        },
      ]);
    }
    if (line.received >= line.quantity && !this.#filled.has(line.id) && !this.#seen) {
      throw wrongState(
        `Line ${line.position} of the order is complete. Receive what came beyond it without the order.`,
      );
    }
    line.received += quantity;
    this.#filled.add(line.id);
    return line;
  }

  /** A service is done with the delivery that brings it back, as so many lots, of whichever leather they have become. */
  #fillService(
    line: PurchaseLine,
    { came, quantity, field }: { came: Came; quantity: number; field: string },
  ): PurchaseLine {
    if ('hardwareId' in came) {
      const message = `Line ${line.position} is leather that is out for ${line.service ?? ''}. Receive it as a lot.`;
      throw invalid([{ field: `${field}.purchaseLineId`, message }]);
    }
    if (line.closed && !this.#filled.has(line.id)) throw isOutNoMore(line);
    line.received += quantity;
    line.closed = true;
    this.#filled.add(line.id);
    return line;
  }

  /** The order's state follows what has come; `nothingMore` closes it although something is missing. */
  async finish({ came, nothingMore }: { came: boolean; nothingMore: boolean }): Promise<void> {
    if (this.#order === null) return;
    const order = this.#order;
    const from = order.state;
    if (this.#lines.every((line) => line.received === 0)) throw nothingCame(order);
    if (came) order.receipts += 1;
    const complete = this.#lines.every((line) => line.closed || line.received >= line.quantity);
    order.state = complete || nothingMore ? 'received' : 'part received';
    await noteAwaited(this.#work, order);
    await logDeed(this.#work, {
      action: `received ${order.state === 'received' ? 'the last' : 'a part'} of purchase order ${order.number}`,
      subjectKind: 'purchase order',
      subjectId: order.id,
      detail: { from, to: order.state, complete },
    });
  }
}

function awaitsNothing(order: PurchaseOrder) {
  if (order.state === 'draft')
    return wrongState(`${order.number} has not been sent. Send it first.`, ['send', 'cancel']);
  return wrongState(`${order.number} is ${order.state}. Receive what came without the order.`, [
    'receive without the order',
  ]);
}

function isOutNoMore({ position, received, service }: PurchaseLine) {
  const where =
    received > 0 ? `came back from ${service ?? ''} already` : 'is back on its lot already';
  return wrongState(
    `The leather of line ${position} ${where}. Receive what came beyond it without the order.`,
    ['receive without the order'],
  );
}

function nothingCame(order: PurchaseOrder) {
  const sentence = `Nothing of ${order.number} has come. Say which of its lines came, or cancel it.`;
  return wrongState(sentence, ['receive', 'cancel']);
}
