import type { MeasuredBlock, Purpose } from '@lidwatch/rules';
import { measuresFromJson } from './measures-json';

/** A district's block as it is read for evaluation: its revision, and a series' block for each purpose. */
export interface EvaluatedInput extends Readonly<Record<Purpose, MeasuredBlock>> {
  readonly tEnd: number;
  readonly rev: number;
}

/** Which revision of which block. */
export interface BlockHead {
  readonly districtId: number;
  readonly tEnd: number;
  readonly rev: number;
}

/** A block's row. */
export interface InputRow extends BlockHead {
  readonly blockS: number;
  readonly spoke: string | null;
  readonly measures: string;
  readonly endSpoke: string | null;
  readonly endMeasures: string | null;
}

/** A row as it is evaluated. */
export function inputOf(row: InputRow): EvaluatedInput {
  const { tEnd, rev } = row;
  const common = { tEnd, blockSeconds: row.blockS };
  const begin = { ...common, speaker: row.spoke, values: measuresFromJson(row.measures) };
  if (row.endMeasures === null) return { tEnd, rev, begin, end: begin };
  return {
    tEnd,
    rev,
    begin,
    end: { ...common, speaker: row.endSpoke, values: measuresFromJson(row.endMeasures) },
  };
}

/** A day and a half of forty districts' ten-minute blocks. */
const MOST_KEPT = 9_000;

/** Blocks that were read: the newest revision read of each, and of all the newest few thousand. */
export class KeptInputs {
  private readonly kept = new Map<string, EvaluatedInput>();

  /** The block in this revision; undefined where it was not read, or has changed since. */
  of(head: BlockHead): EvaluatedInput | undefined {
    const found = this.kept.get(keyOf(head));
    return found?.rev === head.rev ? found : undefined;
  }

  /** Keeps blocks, given by their keys. */
  add(inputs: ReadonlyMap<string, EvaluatedInput>): void {
    for (const [key, input] of inputs) {
      this.kept.delete(key);
      this.kept.set(key, input);
    }
    for (const key of this.kept.keys()) {
      if (this.kept.size <= MOST_KEPT) return;
      this.kept.delete(key);
    }
  }
}

/** What a block is known by. */
export const keyOf = ({ districtId, tEnd }: Omit<BlockHead, 'rev'>): string => `${districtId} ${tEnd}`;
