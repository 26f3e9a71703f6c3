/** What a notice orders: the milder asks, the stronger forbids. */
export type Kind = 'advisory' | 'burnBan';
/** Three-valued truth as the API writes it. */
export type Truth = 'true' | 'false' | 'not known';
/** What a proposal wants done. */
export type Act = 'begin' | 'end';
export type Role = 'administrator' | 'analyst' | 'officer';

/** A number, or what is known of it: exactly one of the fields is there. */
export interface RangeValue {
  exactly?: number;
  atLeast?: number;
  atMost?: number;
  between?: number[];
  /** The reason, in plain words. */
  notKnown?: string;
}

export interface Page<T> {
  items: T[];
  total: number;
  page: number;
  pageSize: number;
}

export interface Me {
  id: number;
  name: string;
  email: string;
  role: Role;
  districts: { id: number; slug: string; name: string }[];
}

export interface Level {
  heightM: number;
  temperatureC: number | null;
  sigmaC: number;
  n?: number;
  quality?: string;
}

export type Open = 'no' | 'at the top' | 'cut by a missing level';

export interface Inversion {
  baseM: number;
  topM: number;
  depthM: RangeValue;
  strengthC: RangeValue;
  strengthWithinTowerC: number;
  sigmaC: number;
  probability: number;
  gradientCPer100m: number;
  open: Open;
  sure: boolean;
  form: string;
}

export interface Layer {
  lowerM: number;
  upperM: number;
  lapseRateKPerKm: number | null;
  sigmaKPerKm: number;
  textbookClass: string | null;
  probabilityTRises: number;
}

export interface Profile {
  towerId: number;
  tEnd: string;
  blockMinutes: number;
  rev: number;
  levels: Level[];
  layers: Layer[];
  surface: 'present' | 'absent' | 'not known';
  reason?: string;
  inversion: Inversion | null;
  elevated: { baseM: number; topM: number; strengthC: RangeValue; sure: boolean }[];
  stableDepthM: RangeValue;
  heatDeficitMJPerM2: RangeValue;
  breakUpTemperatureC: RangeValue;
  pressureHpa: number;
  pressureAssumed: boolean;
}

export type NoticeState = 'in force' | 'ended' | 'expired' | 'replaced';

export interface NoticeBrief {
  id: number;
  ref: string;
  districtId: number;
  districtName: string;
  kind: Kind;
  state: string;
  issuedAt: string;
  issuedBy: string;
  effectiveAt: string;
  expiresAt: string;
  endedAt?: string;
  endedBy?: string;
  endReason?: string;
  version: number;
}
export type NoticeRow = NoticeBrief;

export interface DistrictAir {
  districtId: number;
  slug: string;
  name: string;
  timeZone: string;
  tEnd: string | null;
  fresh: boolean;
  reason?: string;
  speaker: { towerId: number; name: string } | null;
  silent: string[];
  finding: {
    surface: 'present' | 'absent' | 'not known';
    strengthC: RangeValue;
    sure: Truth;
    forMinutes: RangeValue;
    open: Open;
  };
  elevatedLid: Truth;
  pm25Hour: RangeValue;
  pm25NowCast: RangeValue;
  pm25Running24h: RangeValue;
  floorToBenchC: RangeValue;
  heatDeficitMJPerM2: RangeValue;
  breakUpTemperatureC: RangeValue;
  mixingHeightM: RangeValue;
  windSpeedMPerS: RangeValue;
  surfaceTemperatureC: RangeValue;
  levels: Level[];
  inForce: NoticeBrief[];
}

export interface ProposalCard {
  id: number;
  districtId: number;
  districtName: string;
  kind: Kind;
  act: Act;
  state: string;
  openedAt: string;
  tEnd: string;
  summary: string;
  confirmedBy?: string;
  confirmedAt?: string;
  note?: string;
  version: number;
}

export interface TowerFreshness {
  id: number;
  name: string;
  newest: string | null;
  late: boolean;
}

export interface Desk {
  at: string;
  districts: DistrictAir[];
  proposals: ProposalCard[];
  towers: TowerFreshness[];
}

export interface HistoryEntry {
  at: string;
  by: string;
  act: string;
  text: string;
}

export interface NoticeText {
  subject: string;
  mailText: string;
  mailHtml: string;
  sms: string;
  public: {
    headline: string;
    until: string;
    whatToDo: string[];
    why: string;
    exemptions: string;
    cautions: string[];
  };
}

export interface NoticePreview {
  kind: Kind;
  act: Act;
  districtId: number;
  expiresAt: string;
  hash: string;
  texts: { en: NoticeText; es: NoticeText };
  recipients: { people: number; emails: number; texts: number };
  segments: { en: number; es: number };
  needsPassword: boolean;
}

export interface DistrictHistory {
  districtId: number;
  timeZone: string;
  from: string;
  to: string;
  stepMinutes: number;
  points: HistoryPoint[];
  limits: HistoryLimit[];
  notices: NoticeBrief[];
  nights: { from: string; to: string }[];
}

export interface HistoryPoint {
  t: string;
  strength: RangeValue;
  within: number | null;
  sure: Truth;
  speakerId: number | null;
  reason?: string;
}

export interface HistoryLimit {
  kind: Kind;
  act: Act;
  measure: string;
  op: string;
  value: number;
  heldMinutes: number;
}

export interface District {
  id: number;
  slug: string;
  name: string;
  timeZone: string;
  latitude: number;
  longitude: number;
  elevationM: number | null;
  towers: { towerId: number; mayBegin: boolean; mayEnd: boolean }[];
  floorTowerId: number | null;
  version: number;
}

export type DeliveryState =
  'queued' | 'sending' | 'accepted' | 'delivered' | 'failed' | 'suppressed' | 'expired';
export type Channel = 'email' | 'sms';

/** What was measured for a clause, as evidence carries it: a plain number is exact; yes is 1, no is 0. */
export type Measured = number | RangeValue | { from: number; to: number };

export interface HeldFacts {
  neededMinutes: number;
  toleratedMinutes: number;
  recordMinutes: number;
  trueMinutes: number;
  falseMinutes: number;
  notKnownMinutes: number;
}

interface Evaluated {
  truth: Truth;
  now: Truth;
  held?: HeldFacts;
}
export interface EvaluatedClause extends Evaluated {
  kind: 'clause';
  measure: string;
  op: string;
  value: number | boolean;
  measured: Measured;
}
export interface EvaluatedGroup extends Evaluated {
  kind: 'all' | 'any' | 'not';
  parts: EvaluatedNode[];
}
export type EvaluatedNode = EvaluatedClause | EvaluatedGroup;

export interface EvidenceView {
  tree: EvaluatedNode;
  sentences: { en: string[]; es: string[] };
  sha256: string;
}

export interface ProposalDetail extends ProposalCard {
  rule: { id: number; version: number };
  evidence: EvidenceView;
  profile: Profile | null;
  history: HistoryEntry[];
}

export interface DeliveryCount {
  channel: Channel;
  state: DeliveryState;
  count: number;
}

export interface NoticeDetail extends NoticeRow {
  origin: string;
  reason: string;
  texts: { en: NoticeText; es: NoticeText };
  evidence?: EvidenceView;
  events: { seq: number; kind: string; at: string; by: string; text: string }[];
  delivery: DeliveryCount[];
}

export interface Delivery {
  id: number;
  channel: Channel;
  to: string;
  state: DeliveryState;
  attempts: number;
  lastAt: string | null;
  detail: string;
}
