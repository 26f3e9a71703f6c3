import type { components } from './schema';

/** The API's shapes by name; written in the API, generated into `schema.d.ts`. */
type Shapes = components['schemas'];

export type RangeValue = Shapes['RangeValue'];
export type Me = Shapes['Me'];
export type Role = Me['role'];
export type Level = Pick<Shapes['ProfileLevel'], 'heightM' | 'temperatureC' | 'sigmaC'> &
  Partial<Shapes['ProfileLevel']>;
export type Inversion = Shapes['SurfaceInversion'];
export type Open = Inversion['open'];
export type Layer = Shapes['ProfileLayer'];
export type Profile = Shapes['Profile'];
export type NoticeBrief = Shapes['NoticeBrief'];
export type NoticeRow = NoticeBrief;
export type NoticeState = NoticeBrief['state'];
/** What a notice orders: the milder asks, the stronger forbids. */
export type Kind = NoticeBrief['kind'];
export type DistrictAir = Shapes['DistrictAir'];
/** Three-valued truth as the API writes it. */
export type Truth = DistrictAir['elevatedLid'];
export type ProposalCard = Shapes['ProposalCard'];
/** What a proposal wants done. */
export type Act = ProposalCard['act'];
export type TowerFreshness = Shapes['TowerFreshness'];
export type Desk = Shapes['Desk'];
export type HistoryEntry = Shapes['HistoryEntry'];
export type NoticeText = Shapes['NoticeText'];
export type NoticePreview = Shapes['NoticePreview'];
export type DistrictHistory = Shapes['DistrictHistory'];
export type HistoryPoint = Shapes['HistoryPoint'];
export type HistoryLimit = Shapes['HistoryLimit'];
export type District = Shapes['District'];
export type Delivery = Shapes['Delivery'];
export type DeliveryState = Delivery['state'];
export type Channel = Delivery['channel'];
export type DeliveryCount = Shapes['DeliveryCount'];
export type HeldFacts = Shapes['HeldFacts'];

/** A clause with what was measured; the API writes clauses and groups as one shape, told apart by `kind`. */
export type EvaluatedClause = Omit<Shapes['EvaluatedNode'], 'kind' | 'parts' | ClauseOnly> & {
  kind: 'clause';
} & Required<Pick<Shapes['EvaluatedNode'], ClauseOnly>>;
/** A group with its evaluated parts. */
export type EvaluatedGroup = Omit<Shapes['EvaluatedNode'], 'kind' | 'parts' | ClauseOnly> & {
  kind: 'all' | 'any' | 'not';
  parts: EvaluatedNode[];
};
export type EvaluatedNode = EvaluatedClause | EvaluatedGroup;
type ClauseOnly = 'measure' | 'op' | 'value' | 'measured';

export type EvidenceView = Omit<Shapes['Evidence'], 'tree'> & { tree: EvaluatedNode };
export type ProposalDetail = Omit<Shapes['ProposalDetail'], 'evidence'> & { evidence: EvidenceView };
export type NoticeDetail = Omit<Shapes['NoticeDetail'], 'evidence'> & { evidence?: EvidenceView };

/** One page of a list. */
export interface Page<T> {
  items: T[];
  total: number;
  page: number;
  pageSize: number;
}
