/** One allowed step of a lifecycle: from a state, by an act, to a state. */
export interface Transition<State extends string, Act extends string> {
  from: State;
  act: Act;
  to: State;
}

/** A lifecycle as data: where it begins and the steps that exist. A step not listed does not exist. */
export interface Lifecycle<State extends string, Act extends string> {
  first: State;
  transitions: readonly Transition<State, Act>[];
}

/** The state an act leads to, or undefined when the act is not possible in that state. */
export function after<State extends string, Act extends string>(
  lifecycle: Lifecycle<State, Act>,
  from: State,
  act: Act,
): State | undefined {
  return lifecycle.transitions.find((step) => step.from === from && step.act === act)?.to;
}

/** The acts that are possible in a state, in the order of the table. */
export function possibleActs<State extends string, Act extends string>(
  lifecycle: Lifecycle<State, Act>,
  from: State,
): Act[] {
  return lifecycle.transitions.filter((step) => step.from === from).map((step) => step.act);
}

/** The states in which an act is possible. */
export function statesBefore<State extends string, Act extends string>(
  lifecycle: Lifecycle<State, Act>,
  act: Act,
): State[] {
  return lifecycle.transitions.filter((step) => step.act === act).map((step) => step.from);
}
