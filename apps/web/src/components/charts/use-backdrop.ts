import { useMemo } from 'react';
import type { DistrictHistory } from '../../lib/api/types';
import type { ColorName } from '../../theme/palette';
import { limitLines } from './limit-lines';
import type { Backdrop } from './strength-backdrop';
import { gapsOf } from './strength-series';

const ms = (instant: string) => new Date(instant).getTime();

/** What lies behind the line of a history, in the colours now shown; nights only where they can be told apart. */
export function useBackdrop(
  history: DistrictHistory,
  colors: Record<ColorName, string>,
  withNights: boolean,
): Backdrop {
  return useMemo(
    () => ({
      colors,
      gaps: gapsOf(history, Date.now()),
      limits: limitLines(history.limits),
      nights: withNights ? history.nights.map(({ from, to }) => ({ from: ms(from), to: ms(to) })) : [],
      notices: history.notices.map((notice) => ({
        ...notice,
        from: ms(notice.effectiveAt),
        to: ms(notice.endedAt ?? notice.expiresAt),
      })),
    }),
    [colors, history, withNights],
  );
}
