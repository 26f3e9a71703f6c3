import type { components } from '../../lib/api/schema';

type Shapes = components['schemas'];

/** A district's public answer. */
export type PublicStatus = Shapes['PublicStatus'];
/** What holds in a district, as residents are told. */
export type PublicState = PublicStatus['state'];
/** What a notice, or its absence, says to residents in one language; times are written in the district's zone. */
export type PublicText = Shapes['PublicText'];
/** A kind of burning that a notice speaks of. */
export type BurningKind = Shapes['StoveText']['kind'];
