import { fromWire, toWire, type Quantity, type WireQuantity } from '@lidwatch/atmosphere';
import type { EvaluatedNode } from './evaluated-node';

/** An evaluated tree in a form JSON can carry: what is stored, hashed, shown and mailed. */
export type Evidence = EvaluatedNode<WireQuantity>;

function mapped<From, To>(node: EvaluatedNode<From>, convert: (measured: From) => To): EvaluatedNode<To> {
  if (node.kind === 'clause') return { ...node, measured: convert(node.measured) };
  return { ...node, parts: node.parts.map((part) => mapped(part, convert)) };
}

/**
 * The evaluated tree for JSON: bounds as 5.8, `{ atLeast: 5.8 }` or `{ notKnown: reason }`.
 *
 * Units: each measure's. Valid: any evaluated tree. Source: none (definition).
 */
export function toEvidence(node: EvaluatedNode): Evidence {
  return mapped(node, (measured: Quantity) => toWire(measured));
}

/**
 * The evaluated tree that `toEvidence` wrote, for explaining it again.
 *
 * Units: each measure's. Valid: what `toEvidence` gave. Source: none (definition).
 */
export function fromEvidence(evidence: Evidence): EvaluatedNode {
  return mapped(evidence, fromWire);
}
