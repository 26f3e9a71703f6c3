import type { Quantity } from '@lidwatch/atmosphere';
import type { NoticeKind } from '@lidwatch/contracts';

/** The languages a notice is written in. */
export type Language = 'en' | 'es';

/** Everything a notice's words depend on. The same facts give the same words, so a preview is what goes out. */
export interface NoticeFacts {
  act: 'begin' | 'end';
  kind: NoticeKind;
  /** The notice's short reference, `MF-26-017`. */
  ref: string;
  officeName: string;
  district: { name: string; slug: string; timeZone: string; ordinanceRef: string; phone: string };
  /** Written end, UTC epoch seconds. */
  expiresAt: number;
  /** Strength of the surface inversion the decision rests on; absent when it rests on something else. */
  strengthC?: Quantity;
  publicUrl: string;
}
