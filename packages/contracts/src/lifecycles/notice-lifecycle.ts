import type { Lifecycle } from './lifecycle';

/** The two kinds of notice: an advisory asks, a burn ban orders. */
export const noticeKinds = ['advisory', 'burnBan'] as const;

/** A kind of notice. */
export type NoticeKind = (typeof noticeKinds)[number];

/** Where a notice stands. */
export type NoticeState = 'in force' | 'ended' | 'replaced';

/** What happens to a notice: a person ends it, its written end comes, or another of its kind takes its place. */
export type NoticeAct = 'end' | 'expire' | 'replace';

/** A notice's lifecycle: it is born in force and leaves that state once. */
export const noticeLifecycle = {
  first: 'in force',
  transitions: [
    { from: 'in force', act: 'end', to: 'ended' },
    { from: 'in force', act: 'expire', to: 'ended' },
    { from: 'in force', act: 'replace', to: 'replaced' },
  ],
} as const satisfies Lifecycle<NoticeState, NoticeAct>;
