import type { StateName } from '../../components/ui/state-shape';
import type { PublicState } from './public-status';

/** The ending of the classes that tint a state: `answer-ban`, `state-ban`. */
export const STATE_CLASS: Readonly<Record<PublicState, string>> = {
  'no restriction': 'none',
  advisory: 'advisory',
  'burn ban': 'ban',
  'not known': 'unknown',
};

/** The shape that tells a state without colour. */
export const STATE_SHAPE: Readonly<Record<PublicState, StateName>> = {
  'no restriction': 'none',
  advisory: 'advisory',
  'burn ban': 'burnBan',
  'not known': 'unknown',
};
