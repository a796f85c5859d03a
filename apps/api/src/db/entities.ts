import { IdempotentReply } from '../http/idempotency.entity.ts';
import { Activity } from '../modules/activity/activity.entity.ts';
import { CountLine } from '../modules/counts/count-line.entity.ts';
import { StockCount } from '../modules/counts/stock-count.entity.ts';
import { Customer } from '../modules/customers/customer.entity.ts';
import { StoredFile } from '../modules/files/stored-file.entity.ts';
import { Design } from '../modules/designs/design.entity.ts';
import { FinishedMovement } from '../modules/finished-pieces/finished-movement.entity.ts';
import { FinishedPiece } from '../modules/finished-pieces/finished-piece.entity.ts';
import { ShelfSale } from '../modules/finished-pieces/shelf-sale.entity.ts';
import { Hardware } from '../modules/hardware/hardware.entity.ts';
import { KitPart } from '../modules/hardware/kit-part.entity.ts';
import { StandIn } from '../modules/hardware/stand-in.entity.ts';
import { InvoiceLine } from '../modules/invoices/invoice-line.entity.ts';
import { InvoiceTax } from '../modules/invoices/invoice-tax.entity.ts';
import { Invoice } from '../modules/invoices/invoice.entity.ts';
import { BenchLog } from '../modules/jobs/bench-log.entity.ts';
import { JobStep } from '../modules/jobs/job-step.entity.ts';
import { Job } from '../modules/jobs/job.entity.ts';
import { StoredLayout } from '../modules/layouts/layout.entity.ts';
import { Leather } from '../modules/leathers/leather.entity.ts';
import { CustomerLink } from '../modules/links/customer-link.entity.ts';
import { Lot } from '../modules/lots/lot.entity.ts';
import { OutgoingMail } from '../modules/mail/outgoing-mail.entity.ts';
import { OrderCancellation } from '../modules/orders/order-cancellation.entity.ts';
import { Order } from '../modules/orders/order.entity.ts';
import { PromiseMove } from '../modules/orders/promise-move.entity.ts';
import { PatternVersion } from '../modules/patterns/pattern-version.entity.ts';
import { Pattern } from '../modules/patterns/pattern.entity.ts';
import { Payment } from '../modules/payments/payment.entity.ts';
import { Person } from '../modules/people/person.entity.ts';
import { WebSession } from '../modules/people/web-session.entity.ts';
import { Period } from '../modules/periods/period.entity.ts';
import { Posting } from '../modules/periods/posting.entity.ts';
import { Press } from '../modules/presses/press.entity.ts';
import { PurchaseLine } from '../modules/purchase-orders/purchase-line.entity.ts';
import { PurchaseOrder } from '../modules/purchase-orders/purchase-order.entity.ts';
import { QuoteBreak } from '../modules/quotes/quote-break.entity.ts';
import { Quote } from '../modules/quotes/quote.entity.ts';
import { DeliveryAnswer } from '../modules/receipts/delivery-answer.entity.ts';
import { ReceiptLine } from '../modules/receipts/receipt-line.entity.ts';
import { Receipt } from '../modules/receipts/receipt.entity.ts';
import { ReservationMovement } from '../modules/stock/reservation-movement.entity.ts';
import { Reservation } from '../modules/stock/reservation.entity.ts';
import { StockBalance } from '../modules/stock/stock-balance.entity.ts';
import { StockMovement } from '../modules/stock/stock-movement.entity.ts';
import { SupplierOffer } from '../modules/supplier-offers/supplier-offer.entity.ts';
import { ClaimCredit } from '../modules/supplier-claims/claim-credit.entity.ts';
import { ClaimedLot } from '../modules/supplier-claims/claimed-lot.entity.ts';
import { SupplierClaim } from '../modules/supplier-claims/supplier-claim.entity.ts';
import { Supplier } from '../modules/suppliers/supplier.entity.ts';
import { TaxRate } from '../modules/tax-rates/tax-rate.entity.ts';
import { TimeReading } from '../modules/time-readings/time-reading.entity.ts';
import { Impression } from '../modules/tools/impression.entity.ts';
import { PlateOffer } from '../modules/tools/plate-offer.entity.ts';
import { Tool } from '../modules/tools/tool.entity.ts';
import { Workshop } from '../modules/workshop/workshop.entity.ts';
import { Counter } from './counter.entity.ts';

/** Every table has one entity, and every entity is named here. */
export const entities = [
  Activity,
  BenchLog,
  ClaimCredit,
  ClaimedLot,
  Counter,
  CountLine,
  StockCount,
  Customer,
  CustomerLink,
  Design,
  FinishedMovement,
  FinishedPiece,
  ShelfSale,
  Hardware,
  IdempotentReply,
  Impression,
  Invoice,
  InvoiceLine,
  InvoiceTax,
  Job,
  JobStep,
  KitPart,
  Leather,
  Lot,
  Order,
  OrderCancellation,
  PromiseMove,
  OutgoingMail,
  Pattern,
  PatternVersion,
  Payment,
  Period,
  Person,
  PlateOffer,
  Posting,
  Press,
  PurchaseLine,
  PurchaseOrder,
  Quote,
  QuoteBreak,
  Receipt,
  DeliveryAnswer,
  ReceiptLine,
  Reservation,
  ReservationMovement,
  StandIn,
  StockBalance,
  StockMovement,
  StoredFile,
  StoredLayout,
  Supplier,
  SupplierOffer,
  SupplierClaim,
  TaxRate,
  TimeReading,
  Tool,
  WebSession,
  Workshop,
];
