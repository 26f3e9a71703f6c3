import { createHash } from 'node:crypto';
import { toEvidence, type EvaluatedNode, type Evidence, type NoticeKind } from '@lidwatch/rules';
import { Injectable } from '@nestjs/common';
import { Sql } from '../../database/sql';
import type { DistrictEvaluation } from './live-evaluation';

/** What stands behind a proposal or a notice: the evaluated tree with what was measured, and by which rule. */
export interface EvidenceBody {
  readonly districtId: number;
  readonly kind: NoticeKind;
  readonly act: 'begin' | 'end';
  /** End of the block that was judged, UTC epoch seconds. */
  readonly tEnd: number;
  readonly rule: { readonly id: number; readonly version: number; readonly sha256: string };
  readonly spoke: string | null;
  readonly tree: Evidence;
}

/** Evidence as it is kept: the text whose hash it carries. */
export interface KeptEvidence {
  readonly id: number;
  readonly sha256: string;
  readonly body: EvidenceBody;
}

const KEEP = `WITH j AS (SELECT $1 sha256, $2 body) INSERT INTO evidence (sha256, body) SELECT sha256, body FROM j WHERE true
  ON CONFLICT DO UPDATE SET body = evidence.body RETURNING id`;

/** Keeps evidence by its SHA-256; the same evidence is kept once. */
@Injectable()
export class EvidenceService {
  constructor(private readonly sql: Sql) {}

  /** Keeps what one evaluation found for one kind and act, in the caller's transaction. */
  async keep(
    evaluation: DistrictEvaluation,
    kind: NoticeKind,
    act: 'begin' | 'end',
    tree: EvaluatedNode,
  ): Promise<{ id: number; sha256: string }> {
    const { districtId, tEnd, spoke } = evaluation;
    const { id, version, sha256: ruleSha256 } = evaluation.rule;
    const rule = { id, version, sha256: ruleSha256 };
    const body: EvidenceBody = { districtId, kind, act, tEnd, rule, spoke, tree: toEvidence(tree) };
    const text = JSON.stringify(body);
    const sha256 = createHash('sha256').update(text).digest('hex');
    const [kept] = await this.sql.returning<{ id: number }>(KEEP, [sha256, text]);
    return { id: kept!.id, sha256 };
  }

  /** Evidence by its id; a row whose text no longer has its hash is refused as damaged. */
  async read(id: number): Promise<KeptEvidence> {
    const row = await this.sql.get<{ sha256: string; body: string }>(
      'SELECT sha256, body FROM evidence WHERE id = $1',
      [id],
    );
    if (!row) throw new Error(`Evidence ${id} is missing from the store. Restore it from a backup.`);
    if (createHash('sha256').update(row.body).digest('hex') !== row.sha256) {
      throw new Error(`Evidence ${id} no longer has its hash ${row.sha256}. Restore it from a backup.`);
    }
    return { id, sha256: row.sha256, body: JSON.parse(row.body) as EvidenceBody };
  }
}
