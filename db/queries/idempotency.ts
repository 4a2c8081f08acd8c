import type { Db } from '@/db/client';
import { newId } from '@/lib/id';

export interface IdempotentAnswer {
  requestHash: string;
  status: number;
  answer: unknown;
}

/**
 * Waits while the same key is being worked on (a lock for the transaction's life), then answers what the first request was answered.
 */
export async function findIdempotentAnswer(
  db: Db,
  accountId: string,
  key: string,
): Promise<IdempotentAnswer | undefined> {
  await db.raw('select pg_advisory_xact_lock(hashtextextended(?, 0))', [`${accountId}:${key}`]);
  return db('idempotency_keys')
    .where({ account_id: accountId, key })
    .first({ requestHash: 'request_hash', status: 'status', answer: 'answer' });
}

export async function keepIdempotentAnswer(
  db: Db,
  kept: { accountId: string; key: string; requestHash: string; answer: { status?: number; body?: unknown } },
): Promise<void> {
  await db('idempotency_keys').insert({
    organisation_id: db.raw('app_organisation()'),
    id: newId(),
    account_id: kept.accountId,
    key: kept.key,
    request_hash: kept.requestHash,
    status: kept.answer.status ?? (kept.answer.body === undefined ? 204 : 200),
    answer: kept.answer.body === undefined ? null : JSON.stringify(kept.answer.body),
  });
}
