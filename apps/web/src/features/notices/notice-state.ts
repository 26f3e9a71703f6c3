import type { StateName } from '../../components/ui/state-shape';
import type { NoticeBrief } from '../../lib/api/types';

const STATES: Record<string, string> = { 'in force': 'in force', ended: 'ended', replaced: 'replaced' };

/** Where a notice stands, in words. */
export const noticeStateWords = ({ state }: Pick<NoticeBrief, 'state'>): string => STATES[state] ?? state;

/** The shape and colour of a notice: its kind's own while it is in force, plain once it is over. */
export const noticeShape = ({ kind }: Pick<NoticeBrief, 'kind'>): StateName => kind;

/** Whether the notice holds now. */
export const isInForce = ({ state }: Pick<NoticeBrief, 'state'>): boolean => state === 'in force';
