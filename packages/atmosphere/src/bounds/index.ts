export {
  NotANumberError,
  atLeast,
  atMost,
  between,
  exactly,
  fromMeasured,
  isKnown,
  isNotKnown,
  notKnown,
  numberOrNull,
} from './quantity';
export type { NotKnownReason, Quantity } from './quantity';
export { and, not, or, truthOf } from './truth';
export type { Truth } from './truth';
export { COMPARISONS, compare } from './compare';
export type { Comparison } from './compare';
export { add, divide, multiply, narrow, scale, subtract } from './arithmetic';
export { maximum, median, minimum } from './order';
export { fromWire, toWire } from './wire';
export type { WireQuantity } from './wire';
