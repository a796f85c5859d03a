import { createHash } from 'node:crypto';
import { Store, type SessionData } from 'express-session';
import type { MikroORM } from '@mikro-orm/sqlite';
import { WebSession } from '../modules/people/web-session.entity.ts';
import type { Clock } from '../outside/clock.ts';

const idleMs = 12 * 3_600_000;
const absoluteMs = 30 * 24 * 3_600_000;
/** An unchanged session's end is moved on at most this often, so that reading stays reading. */
const touchEveryMs = 10 * 60_000;

declare module 'express-session' {
  interface SessionData {
    /** When it began and when it ends by now; read with it, so that touching it need not read it again. */
    life?: { beganAt: string; endsAt: string };
    /** Who is signed in, as the database has them now, read with it; null when they may no longer be. */
    person?: Express.User | null;
  }
}

type Done<T = void> = (error?: unknown, value?: T | null) => void;

/** Keeps sessions in the database; a session ends when idle for 12 hours, and in any case after 30 days. */
export class SessionStore extends Store {
  readonly #orm: MikroORM;
  readonly #clock: Clock;

  constructor(orm: MikroORM, clock: Clock) {
    super();
    this.#orm = orm;
    this.#clock = clock;
  }

  override get(sessionId: string, done: Done<SessionData>): void {
    settle(this.#find(sessionId), done);
  }

  override set(sessionId: string, session: SessionData, done: Done = () => undefined): void {
    settle(this.#keep(sessionId, session), done);
  }

  override destroy(sessionId: string, done: Done = () => undefined): void {
    settle(
      this.#orm.em
        .fork()
        .nativeDelete(WebSession, { idHash: hash(sessionId) })
        .then(() => undefined),
      done,
    );
  }

  override touch(sessionId: string, session: SessionData, done: Done = () => undefined): void {
    settle(this.#extend(sessionId, session), done);
  }

  /** Every request asks for it: in one statement of plain SQL, which is quicker than entities. */
  async #find(sessionId: string): Promise<SessionData | null> {
    const [row] = await this.#orm.em.execute<Kept[]>(
      `SELECT s.data, s.created_at, s.expires_at, p.id, p.name, p.email, p.role FROM web_session s
      LEFT JOIN person p ON p.id = s.person_id AND p.active = 1 WHERE s.id_hash = ?`,
      [hash(sessionId)],
    );
    if (row === undefined || row.expires_at <= this.#clock.now().toISOString()) return null;
    const { id, name, email, role } = row;
    return {
      ...(JSON.parse(row.data) as SessionData),
      life: { beganAt: row.created_at, endsAt: row.expires_at },
      person: id === null ? null : { id, name, email, role },
    };
  }

  async #keep(sessionId: string, session: SessionData): Promise<void> {
    const now = this.#clock.now();
    await this.#orm.em.fork().transactional(async (em) => {
      await em.nativeDelete(WebSession, { expiresAt: { $lte: now.toISOString() } });
      const kept = await em.findOne(WebSession, { idHash: hash(sessionId) });
      const row = kept ?? em.create(WebSession, blankSession(sessionId, now));
      row.personId = personOf(session);
      row.data = JSON.stringify({ ...session, life: undefined, person: undefined });
      em.persist(row);
    });
  }

  async #extend(sessionId: string, { life }: SessionData): Promise<void> {
    if (life === undefined) return;
    const now = this.#clock.now();
    const end = Math.min(now.getTime() + idleMs, new Date(life.beganAt).getTime() + absoluteMs);
    if (end - new Date(life.endsAt).getTime() < touchEveryMs) return;
    await this.#orm.em
      .fork()
      .nativeUpdate(
        WebSession,
        { idHash: hash(sessionId) },
        { expiresAt: new Date(end).toISOString() },
      );
  }
}

interface Kept extends Omit<Express.User, 'id'> {
  data: string;
  created_at: string;
  expires_at: string;
  id: number | null;
}

const hash = (sessionId: string) => createHash('sha256').update(sessionId).digest('hex');

function blankSession(sessionId: string, now: Date) {
  return {
    idHash: hash(sessionId),
    data: '{}',
    expiresAt: new Date(now.getTime() + idleMs).toISOString(),
    createdAt: now.toISOString(),
  };
}

function personOf(session: SessionData): number | null {
  const passport = 'passport' in session ? session.passport : undefined;
  if (typeof passport !== 'object' || passport === null || !('user' in passport)) return null;
  return typeof passport.user === 'number' ? passport.user : null;
}

function settle<T>(result: Promise<T | null>, done: Done<T>): void {
  result.then(
    (value) => {
      done(undefined, value);
    },
    (error: unknown) => {
      done(error);
    },
  );
}
