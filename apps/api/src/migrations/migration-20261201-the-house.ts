import { Migration } from '@mikro-orm/migrations';
import { appendOnly } from './append-only.ts';

const states = (...names: string[]) => names.map((name) => `'${name}'`).join(', ');

const house = [
  `CREATE TABLE workshop (
    id INTEGER PRIMARY KEY CHECK (id = 1),
    mode TEXT NOT NULL CHECK (mode IN ('demo', 'shop')),
    name TEXT NOT NULL CHECK (length(name) BETWEEN 1 AND 80),
    currency TEXT NOT NULL CHECK (length(currency) = 3),
    area_unit TEXT NOT NULL CHECK (area_unit IN ('ft2', 'dm2', 'm2')),
    length_unit TEXT NOT NULL CHECK (length_unit IN ('mm', 'in')),
    time_zone TEXT NOT NULL,
    target_per_hour INTEGER NOT NULL CHECK (target_per_hour >= 0),
    wage_per_hour INTEGER NOT NULL CHECK (wage_per_hour >= 0),
    desk_minutes_per_order INTEGER NOT NULL CHECK (desk_minutes_per_order BETWEEN 0 AND 10000),
    packing_per_order INTEGER NOT NULL CHECK (packing_per_order >= 0),
    reject_percent INTEGER NOT NULL CHECK (reject_percent BETWEEN 0 AND 990000),
    confidence_percent INTEGER NOT NULL CHECK (confidence_percent BETWEEN 500000 AND 999999),
    price_step INTEGER NOT NULL CHECK (price_step > 0),
    bench_hours_per_day INTEGER NOT NULL CHECK (bench_hours_per_day BETWEEN 0 AND 24000),
    spacing_mm INTEGER NOT NULL CHECK (spacing_mm >= 0),
    trim_mm INTEGER NOT NULL CHECK (trim_mm >= 0),
    deposit_percent INTEGER NOT NULL CHECK (deposit_percent BETWEEN 0 AND 1000000),
    quote_valid_days INTEGER NOT NULL CHECK (quote_valid_days BETWEEN 1 AND 730),
    payment_term_days INTEGER NOT NULL CHECK (payment_term_days BETWEEN 0 AND 365),
    address TEXT NOT NULL,
    tax_number TEXT NOT NULL,
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0),
    created_at TEXT NOT NULL
  ) STRICT`,
  `CREATE TABLE person (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    email TEXT NOT NULL UNIQUE CHECK (email = lower(email)),
    name TEXT NOT NULL CHECK (length(name) BETWEEN 1 AND 80),
    role TEXT NOT NULL CHECK (role IN ('owner', 'maker', 'bookkeeper')),
    password_hash TEXT NOT NULL,
    active INTEGER NOT NULL CHECK (active IN (0, 1)),
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0),
    created_at TEXT NOT NULL
  ) STRICT`,
  `CREATE TABLE web_session (
    id_hash TEXT PRIMARY KEY NOT NULL,
    person_id INTEGER REFERENCES person (id),
    data TEXT NOT NULL,
    expires_at TEXT NOT NULL,
    created_at TEXT NOT NULL
  ) STRICT`,
  `CREATE INDEX web_session_expires ON web_session (expires_at)`,
  `CREATE TABLE idempotent_reply (
    key TEXT NOT NULL,
    scope TEXT NOT NULL,
    request_hash TEXT NOT NULL,
    status INTEGER NOT NULL,
    reply TEXT NOT NULL,
    created_at TEXT NOT NULL,
    PRIMARY KEY (key, scope)
  ) STRICT`,
  `CREATE TABLE counter (name TEXT PRIMARY KEY NOT NULL, next INTEGER NOT NULL CHECK (next > 0)) STRICT`,
  `CREATE TABLE activity (
    seq INTEGER PRIMARY KEY,
    at TEXT NOT NULL,
    actor_id INTEGER REFERENCES person (id),
    actor_name TEXT NOT NULL,
    actor_role TEXT NOT NULL,
    action TEXT NOT NULL,
    subject_kind TEXT NOT NULL,
    subject_id INTEGER,
    detail TEXT NOT NULL CHECK (json_valid(detail)),
    previous_hash TEXT NOT NULL,
    hash TEXT NOT NULL UNIQUE
  ) STRICT`,
  `CREATE INDEX activity_subject ON activity (subject_kind, subject_id, seq)`,
];

const stockroom = [
  `CREATE TABLE supplier (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    name TEXT NOT NULL UNIQUE,
    email TEXT NOT NULL,
    phone TEXT NOT NULL,
    lead_days INTEGER NOT NULL CHECK (lead_days BETWEEN 0 AND 365),
    note TEXT NOT NULL,
    active INTEGER NOT NULL CHECK (active IN (0, 1)),
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0)
  ) STRICT`,
  `CREATE TABLE leather (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    name TEXT NOT NULL UNIQUE,
    tannage TEXT NOT NULL,
    colour TEXT NOT NULL,
    finish TEXT NOT NULL,
    weight_low_oz INTEGER CHECK (weight_low_oz > 0),
    weight_high_oz INTEGER CHECK (weight_high_oz >= weight_low_oz),
    price_per_ft2 INTEGER NOT NULL CHECK (price_per_ft2 >= 0),
    supplier_id INTEGER REFERENCES supplier (id),
    active INTEGER NOT NULL CHECK (active IN (0, 1)),
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0)
  ) STRICT`,
  `CREATE TABLE hardware (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    name TEXT NOT NULL UNIQUE,
    kind TEXT NOT NULL CHECK (kind IN ('hardware', 'supplies')),
    unit_price INTEGER NOT NULL CHECK (unit_price >= 0),
    pack_size INTEGER NOT NULL CHECK (pack_size > 0),
    reorder_at INTEGER NOT NULL CHECK (reorder_at >= 0),
    supplier_id INTEGER REFERENCES supplier (id),
    active INTEGER NOT NULL CHECK (active IN (0, 1)),
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0)
  ) STRICT`,
  `CREATE TABLE purchase_order (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    number TEXT NOT NULL UNIQUE,
    supplier_id INTEGER NOT NULL REFERENCES supplier (id),
    state TEXT NOT NULL CHECK (state IN (${states('draft', 'sent', 'part received', 'received', 'cancelled')})),
    sent_at TEXT,
    expected_on TEXT,
    note TEXT NOT NULL,
    created_at TEXT NOT NULL,
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0)
  ) STRICT`,
  `CREATE TABLE purchase_line (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    purchase_order_id INTEGER NOT NULL REFERENCES purchase_order (id),
    position INTEGER NOT NULL CHECK (position > 0),
    leather_id INTEGER REFERENCES leather (id),
    hardware_id INTEGER REFERENCES hardware (id),
    quantity INTEGER NOT NULL CHECK (quantity > 0),
    received INTEGER NOT NULL CHECK (received >= 0),
    unit_price INTEGER NOT NULL CHECK (unit_price >= 0),
    UNIQUE (purchase_order_id, position),
    CHECK ((leather_id IS NULL) <> (hardware_id IS NULL))
  ) STRICT`,
  `CREATE TABLE lot (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    tag TEXT NOT NULL UNIQUE,
    leather_id INTEGER NOT NULL REFERENCES leather (id),
    form TEXT NOT NULL CHECK (form IN (${states(
      'side',
      'hide',
      'back',
      'bend',
      'shoulder',
      'double shoulder',
      'belly',
      'panel',
      'strip',
      'offcut',
    )})),
    measured_area_mm2 INTEGER NOT NULL CHECK (measured_area_mm2 > 0),
    pieces INTEGER NOT NULL CHECK (pieces > 0),
    width_mm INTEGER CHECK (width_mm > 0),
    height_mm INTEGER CHECK (height_mm > 0),
    cost INTEGER NOT NULL CHECK (cost >= 0),
    grade TEXT NOT NULL,
    shade TEXT NOT NULL,
    place TEXT NOT NULL,
    supplier_lot TEXT NOT NULL,
    received_on TEXT NOT NULL,
    purchase_line_id INTEGER REFERENCES purchase_line (id),
    parent_id INTEGER REFERENCES lot (id),
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0)
  ) STRICT`,
  `CREATE INDEX lot_leather ON lot (leather_id)`,
  `CREATE TABLE stock_balance (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    lot_id INTEGER UNIQUE REFERENCES lot (id),
    hardware_id INTEGER UNIQUE REFERENCES hardware (id),
    on_hand INTEGER NOT NULL CHECK (on_hand >= 0),
    reserved INTEGER NOT NULL CHECK (reserved >= 0),
    CHECK ((lot_id IS NULL) <> (hardware_id IS NULL))
  ) STRICT`,
];

const patternRoom = [
  `CREATE TABLE pattern (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    name TEXT NOT NULL UNIQUE,
    latest_version INTEGER NOT NULL CHECK (latest_version > 0),
    active INTEGER NOT NULL CHECK (active IN (0, 1)),
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0)
  ) STRICT`,
  `CREATE TABLE pattern_version (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    pattern_id INTEGER NOT NULL REFERENCES pattern (id),
    number INTEGER NOT NULL CHECK (number > 0),
    definition TEXT NOT NULL CHECK (json_valid(definition)),
    created_at TEXT NOT NULL,
    created_by TEXT NOT NULL,
    UNIQUE (pattern_id, number)
  ) STRICT`,
  `CREATE TABLE layout (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    input_hash TEXT NOT NULL UNIQUE,
    input TEXT NOT NULL CHECK (json_valid(input)),
    result TEXT NOT NULL CHECK (json_valid(result)),
    pieces INTEGER NOT NULL CHECK (pieces >= 0),
    created_at TEXT NOT NULL
  ) STRICT`,
];

const counterRoom = [
  `CREATE TABLE customer (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    name TEXT NOT NULL UNIQUE,
    contact_name TEXT NOT NULL,
    email TEXT NOT NULL,
    phone TEXT NOT NULL,
    address TEXT NOT NULL,
    note TEXT NOT NULL,
    active INTEGER NOT NULL CHECK (active IN (0, 1)),
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0),
    created_at TEXT NOT NULL
  ) STRICT`,
  `CREATE TABLE quote (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    number TEXT NOT NULL,
    revision INTEGER NOT NULL CHECK (revision > 0),
    customer_id INTEGER NOT NULL REFERENCES customer (id),
    pattern_version_id INTEGER NOT NULL REFERENCES pattern_version (id),
    layout_id INTEGER NOT NULL REFERENCES layout (id),
    title TEXT NOT NULL,
    in_hands_on TEXT,
    valid_until TEXT,
    state TEXT NOT NULL CHECK (state IN (${states('draft', 'sent', 'agreed', 'declined', 'superseded', 'lapsed')})),
    input TEXT NOT NULL CHECK (json_valid(input)),
    numbers TEXT NOT NULL CHECK (json_valid(numbers)),
    overrides TEXT NOT NULL CHECK (json_valid(overrides)),
    message TEXT NOT NULL,
    created_at TEXT NOT NULL,
    sent_at TEXT,
    agreed_at TEXT,
    agreed_quantity INTEGER CHECK (agreed_quantity > 0),
    agreed_how TEXT CHECK (agreed_how IN ('link', 'phone', 'mail', 'counter')),
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0),
    UNIQUE (number, revision),
    CHECK ((state = 'agreed') = (agreed_quantity IS NOT NULL))
  ) STRICT`,
  `CREATE INDEX quote_customer ON quote (customer_id)`,
  `CREATE TABLE quote_break (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    quote_id INTEGER NOT NULL REFERENCES quote (id),
    quantity INTEGER NOT NULL CHECK (quantity > 0),
    typed_price INTEGER CHECK (typed_price >= 0),
    price_each INTEGER NOT NULL CHECK (price_each >= 0),
    total INTEGER NOT NULL CHECK (total >= 0),
    UNIQUE (quote_id, quantity)
  ) STRICT`,
  `CREATE TABLE customer_link (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    token_hash TEXT NOT NULL UNIQUE,
    quote_id INTEGER NOT NULL REFERENCES quote (id),
    expires_at TEXT NOT NULL,
    revoked_at TEXT,
    created_at TEXT NOT NULL
  ) STRICT`,
  `CREATE TABLE customer_order (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    number TEXT NOT NULL UNIQUE,
    quote_id INTEGER NOT NULL UNIQUE REFERENCES quote (id),
    customer_id INTEGER NOT NULL REFERENCES customer (id),
    title TEXT NOT NULL,
    quantity INTEGER NOT NULL CHECK (quantity > 0),
    price_each INTEGER NOT NULL CHECK (price_each >= 0),
    goods_total INTEGER NOT NULL CHECK (goods_total >= 0),
    tooling_charge INTEGER NOT NULL CHECK (tooling_charge >= 0),
    total INTEGER NOT NULL CHECK (total = goods_total + tooling_charge),
    state TEXT NOT NULL CHECK (state IN (${states(
      'awaiting proof',
      'awaiting deposit',
      'awaiting tooling',
      'taken on',
      'in work',
      'packed',
      'part shipped',
      'shipped',
      'closed',
      'cancelled',
    )})),
    awaits TEXT NOT NULL CHECK (json_valid(awaits)),
    in_hands_on TEXT,
    promised_on TEXT NOT NULL,
    taken_on_at TEXT NOT NULL,
    shipped_on TEXT,
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0)
  ) STRICT`,
  `CREATE INDEX order_customer ON customer_order (customer_id)`,
  `CREATE TABLE tool (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    number TEXT NOT NULL,
    kind TEXT NOT NULL CHECK (kind IN ('cutting die', 'stamp plate')),
    name TEXT NOT NULL,
    metal TEXT NOT NULL CHECK (metal IN ('', 'steel', 'magnesium', 'copper', 'brass')),
    cost INTEGER NOT NULL CHECK (cost >= 0),
    life_uses INTEGER NOT NULL CHECK (life_uses > 0),
    used INTEGER NOT NULL CHECK (used >= 0),
    slot TEXT NOT NULL,
    pattern_id INTEGER REFERENCES pattern (id),
    customer_id INTEGER REFERENCES customer (id),
    state TEXT NOT NULL CHECK (state IN (${states('on the rack', 'on order', 'scrapped')})),
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0),
    UNIQUE (kind, number)
  ) STRICT`,
];

const bench = [
  `CREATE TABLE job (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    number TEXT NOT NULL UNIQUE,
    order_id INTEGER NOT NULL UNIQUE REFERENCES customer_order (id),
    pattern_version_id INTEGER NOT NULL REFERENCES pattern_version (id),
    layout_id INTEGER NOT NULL REFERENCES layout (id),
    state TEXT NOT NULL CHECK (state IN (${states('waiting', 'ready', 'at the bench', 'paused', 'finished')})),
    quantity INTEGER NOT NULL CHECK (quantity > 0),
    cut_count INTEGER NOT NULL CHECK (cut_count >= quantity),
    containers INTEGER NOT NULL CHECK (containers > 0),
    planned_minutes INTEGER NOT NULL CHECK (planned_minutes >= 0),
    estimate TEXT NOT NULL CHECK (json_valid(estimate)),
    good INTEGER NOT NULL CHECK (good >= 0),
    seconds INTEGER NOT NULL CHECK (seconds >= 0),
    started_at TEXT,
    finished_at TEXT,
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0)
  ) STRICT`,
  `CREATE TABLE job_step (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    job_id INTEGER NOT NULL REFERENCES job (id),
    position INTEGER NOT NULL CHECK (position > 0),
    name TEXT NOT NULL,
    per TEXT NOT NULL CHECK (per IN ('piece', 'strike', 'panel', 'strip', 'run')),
    setup_minutes INTEGER NOT NULL CHECK (setup_minutes >= 0),
    seconds_per_unit INTEGER NOT NULL CHECK (seconds_per_unit >= 0),
    reject_percent INTEGER NOT NULL CHECK (reject_percent BETWEEN 0 AND 990000),
    planned_minutes INTEGER NOT NULL CHECK (planned_minutes >= 0),
    good INTEGER NOT NULL CHECK (good >= 0),
    rejects INTEGER NOT NULL CHECK (rejects >= 0),
    seconds INTEGER NOT NULL CHECK (seconds >= 0),
    minutes INTEGER NOT NULL CHECK (minutes >= 0),
    UNIQUE (job_id, position)
  ) STRICT`,
  `CREATE TABLE bench_log (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    job_step_id INTEGER NOT NULL REFERENCES job_step (id),
    good INTEGER NOT NULL,
    rejects INTEGER NOT NULL,
    seconds INTEGER NOT NULL,
    minutes INTEGER NOT NULL,
    note TEXT NOT NULL,
    at TEXT NOT NULL,
    day TEXT NOT NULL,
    person_id INTEGER REFERENCES person (id),
    person_name TEXT NOT NULL
  ) STRICT`,
  `CREATE INDEX bench_log_step ON bench_log (job_step_id)`,
  `CREATE TABLE reservation (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    job_id INTEGER NOT NULL REFERENCES job (id),
    lot_id INTEGER REFERENCES lot (id),
    hardware_id INTEGER REFERENCES hardware (id),
    quantity INTEGER NOT NULL CHECK (quantity > 0),
    open INTEGER NOT NULL CHECK (open BETWEEN 0 AND quantity),
    CHECK ((lot_id IS NULL) <> (hardware_id IS NULL))
  ) STRICT`,
  `CREATE INDEX reservation_job ON reservation (job_id)`,
  `CREATE TABLE stock_movement (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    at TEXT NOT NULL,
    day TEXT NOT NULL,
    kind TEXT NOT NULL CHECK (kind IN ('receive', 'take', 'return', 'reject', 'adjust', 'count')),
    lot_id INTEGER REFERENCES lot (id),
    hardware_id INTEGER REFERENCES hardware (id),
    quantity INTEGER NOT NULL CHECK (quantity <> 0),
    value INTEGER NOT NULL,
    job_id INTEGER REFERENCES job (id),
    purchase_order_id INTEGER REFERENCES purchase_order (id),
    reason TEXT NOT NULL,
    actor_id INTEGER REFERENCES person (id),
    actor_name TEXT NOT NULL,
    CHECK ((lot_id IS NULL) <> (hardware_id IS NULL))
  ) STRICT`,
  `CREATE INDEX stock_movement_lot ON stock_movement (lot_id)`,
  `CREATE INDEX stock_movement_hardware ON stock_movement (hardware_id)`,
  `CREATE TABLE impression (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    tool_id INTEGER NOT NULL REFERENCES tool (id),
    uses INTEGER NOT NULL CHECK (uses <> 0),
    job_id INTEGER REFERENCES job (id),
    at TEXT NOT NULL,
    reason TEXT NOT NULL,
    actor_id INTEGER REFERENCES person (id),
    actor_name TEXT NOT NULL
  ) STRICT`,
];

const books = [
  `CREATE TABLE tax_rate (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    name TEXT NOT NULL UNIQUE,
    percent INTEGER NOT NULL CHECK (percent BETWEEN 0 AND 1000000),
    active INTEGER NOT NULL CHECK (active IN (0, 1)),
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0)
  ) STRICT`,
  `CREATE TABLE invoice (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    number TEXT UNIQUE,
    sequence INTEGER UNIQUE CHECK (sequence > 0),
    order_id INTEGER NOT NULL REFERENCES customer_order (id),
    customer_id INTEGER NOT NULL REFERENCES customer (id),
    state TEXT NOT NULL CHECK (state IN (${states('draft', 'issued', 'part paid', 'paid', 'credited')})),
    issued_on TEXT,
    due_on TEXT,
    net INTEGER NOT NULL CHECK (net >= 0),
    tax INTEGER NOT NULL CHECK (tax >= 0),
    total INTEGER NOT NULL CHECK (total = net + tax),
    paid INTEGER NOT NULL CHECK (paid >= 0),
    credited INTEGER NOT NULL CHECK (credited >= 0),
    snapshot TEXT,
    snapshot_hash TEXT,
    created_at TEXT NOT NULL,
    version INTEGER NOT NULL DEFAULT 1 CHECK (version > 0),
    CHECK (paid + credited <= total),
    CHECK ((state = 'draft') = (number IS NULL)),
    CHECK ((number IS NULL) = (sequence IS NULL))
  ) STRICT`,
  `CREATE TABLE invoice_line (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    invoice_id INTEGER NOT NULL REFERENCES invoice (id),
    position INTEGER NOT NULL CHECK (position > 0),
    description TEXT NOT NULL,
    quantity INTEGER NOT NULL CHECK (quantity > 0),
    unit_price INTEGER NOT NULL CHECK (unit_price >= 0),
    amount INTEGER NOT NULL CHECK (amount >= 0),
    tax_rate_id INTEGER REFERENCES tax_rate (id),
    tax_percent INTEGER NOT NULL CHECK (tax_percent BETWEEN 0 AND 1000000),
    UNIQUE (invoice_id, position)
  ) STRICT`,
  `CREATE TABLE invoice_tax (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    invoice_id INTEGER NOT NULL REFERENCES invoice (id),
    percent INTEGER NOT NULL CHECK (percent BETWEEN 0 AND 1000000),
    net INTEGER NOT NULL,
    tax INTEGER NOT NULL,
    UNIQUE (invoice_id, percent)
  ) STRICT`,
  `CREATE TABLE payment (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    invoice_id INTEGER NOT NULL REFERENCES invoice (id),
    amount INTEGER NOT NULL CHECK (amount > 0),
    received_on TEXT NOT NULL,
    method TEXT NOT NULL CHECK (method IN ('bank', 'card', 'cash', 'cheque')),
    note TEXT NOT NULL,
    at TEXT NOT NULL,
    actor_id INTEGER REFERENCES person (id),
    actor_name TEXT NOT NULL
  ) STRICT`,
  `CREATE INDEX payment_invoice ON payment (invoice_id)`,
  `CREATE TABLE posting (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    entry INTEGER NOT NULL CHECK (entry > 0),
    day TEXT NOT NULL,
    account TEXT NOT NULL CHECK (account IN ('receivables', 'sales', 'tax', 'money')),
    amount INTEGER NOT NULL CHECK (amount <> 0),
    invoice_id INTEGER REFERENCES invoice (id),
    payment_id INTEGER REFERENCES payment (id),
    at TEXT NOT NULL
  ) STRICT`,
  `CREATE INDEX posting_day ON posting (day)`,
  `CREATE TABLE period (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    from_day TEXT NOT NULL UNIQUE,
    to_day TEXT NOT NULL UNIQUE CHECK (to_day >= from_day),
    totals TEXT NOT NULL CHECK (json_valid(totals)),
    locked_at TEXT NOT NULL,
    locked_by TEXT NOT NULL
  ) STRICT`,
  `CREATE TRIGGER posting_into_locked_period BEFORE INSERT ON posting
    WHEN EXISTS (SELECT 1 FROM period WHERE NEW.day BETWEEN from_day AND to_day)
    BEGIN SELECT RAISE(ABORT, 'the period is locked'); END`,
  `CREATE TRIGGER issued_invoice_stays BEFORE UPDATE ON invoice
    WHEN OLD.number IS NOT NULL AND (
      NEW.number IS NOT OLD.number OR NEW.sequence IS NOT OLD.sequence OR NEW.order_id IS NOT OLD.order_id
      OR NEW.customer_id IS NOT OLD.customer_id OR NEW.issued_on IS NOT OLD.issued_on OR NEW.due_on IS NOT OLD.due_on
      OR NEW.net IS NOT OLD.net OR NEW.tax IS NOT OLD.tax OR NEW.total IS NOT OLD.total
      OR NEW.snapshot IS NOT OLD.snapshot OR NEW.snapshot_hash IS NOT OLD.snapshot_hash)
    BEGIN SELECT RAISE(ABORT, 'an issued invoice does not change'); END`,
  ...(['invoice_line', 'invoice_tax'] as const).flatMap((table) => [
    `CREATE TRIGGER ${table}_stays_on_update BEFORE UPDATE ON ${table}
      WHEN (SELECT number FROM invoice WHERE id = OLD.invoice_id) IS NOT NULL
      BEGIN SELECT RAISE(ABORT, 'an issued invoice does not change'); END`,
    `CREATE TRIGGER ${table}_stays_on_delete BEFORE DELETE ON ${table}
      WHEN (SELECT number FROM invoice WHERE id = OLD.invoice_id) IS NOT NULL
      BEGIN SELECT RAISE(ABORT, 'an issued invoice does not change'); END`,
    `CREATE TRIGGER ${table}_stays_on_insert BEFORE INSERT ON ${table}
      WHEN (SELECT number FROM invoice WHERE id = NEW.invoice_id) IS NOT NULL
      BEGIN SELECT RAISE(ABORT, 'an issued invoice does not change'); END`,
  ]),
  `CREATE TRIGGER issued_invoice_is_kept BEFORE DELETE ON invoice WHEN OLD.number IS NOT NULL
    BEGIN SELECT RAISE(ABORT, 'an issued invoice is not deleted'); END`,
];

const post = [
  `CREATE TABLE outgoing_mail (
    id INTEGER PRIMARY KEY AUTOINCREMENT,
    recipient TEXT NOT NULL,
    subject TEXT NOT NULL,
    body TEXT NOT NULL,
    attachments TEXT NOT NULL CHECK (json_valid(attachments)),
    state TEXT NOT NULL CHECK (state IN ('waiting', 'sent', 'failed')),
    attempts INTEGER NOT NULL CHECK (attempts >= 0),
    next_try_at TEXT NOT NULL,
    lease_until TEXT,
    sent_at TEXT,
    last_error TEXT,
    subject_kind TEXT NOT NULL,
    subject_id INTEGER NOT NULL,
    created_at TEXT NOT NULL
  ) STRICT`,
  `CREATE INDEX outgoing_mail_waiting ON outgoing_mail (next_try_at) WHERE state = 'waiting'`,
  `CREATE TABLE stored_file (
    hash TEXT PRIMARY KEY NOT NULL,
    name TEXT NOT NULL,
    type TEXT NOT NULL,
    size INTEGER NOT NULL CHECK (size >= 0),
    created_at TEXT NOT NULL
  ) STRICT`,
];

const ledgers = [
  'stock_movement',
  'payment',
  'impression',
  'posting',
  'activity',
  'bench_log',
  'pattern_version',
  'period',
];

/** The whole house: every table STRICT, with the limits that the code enforces said again as CHECKs. */
export class TheHouse extends Migration {
  override up(): void {
    const tables = [house, stockroom, patternRoom, counterRoom, bench, books, post].flat();
    for (const statement of [...tables, ...ledgers.flatMap(appendOnly)]) this.addSql(statement);
  }
}
