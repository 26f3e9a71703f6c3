import type { NoticeRule } from '../definition/rule-definition';
import { mayBeginAt, type LocalMoment } from '../definition/when-allowed';
import type { BlockColumns } from './columns';
import { TRUE, truthColumn } from './truth-column';

/** One notice that a rule would have led to, had everybody done at once what it proposed. */
export interface ReplayedNotice {
  /** UTC epoch seconds. */
  readonly from: number;
  readonly to: number;
  readonly endedBy: 'condition to end' | 'longest validity' | 'end of the record';
}

const HOUR_S = 3600;

/**
 * What a rule would have done over a record: it begins where its condition to begin holds (within its hours and
 * season), and ends where its condition to end holds or its longest validity is over. People are taken to follow every
 * proposal at once; so the wait before a declined or lapsed proposal is made again never comes into it.
 *
 * Units: UTC epoch seconds. Valid: a rule that passed `validateRule`, columns that hold its measures; `localMoment`
 * gives the district's calendar. Not known begins nothing and ends nothing. Source: none (the project's own).
 */
export function replayRule(
  rule: NoticeRule,
  columns: BlockColumns,
  localMoment: (t: number) => LocalMoment,
): ReplayedNotice[] {
  const begins = truthColumn(rule.begin, columns, 'begin');
  const ends = truthColumn(rule.end, columns, 'end');
  const longestS = rule.longestValidityHours * HOUR_S;
  const notices: ReplayedNotice[] = [];
  let from: number | undefined;
  columns.tEnd.forEach((t, i) => {
    if (from !== undefined && t - from >= longestS) {
      notices.push({ from, to: from + longestS, endedBy: 'longest validity' });
      from = undefined;
    }
    if (from !== undefined && ends[i] === TRUE) {
      notices.push({ from, to: t, endedBy: 'condition to end' });
      from = undefined;
    } else if (from === undefined && begins[i] === TRUE && mayBeginAt(rule, localMoment(t))) {
      from = t;
    }
  });
  const last = columns.tEnd.at(-1);
  if (from !== undefined && last !== undefined)
    notices.push({ from, to: last, endedBy: 'end of the record' });
  return notices;
}
