import { useRef, useState } from 'react';
import { asProblem, type ApiProblem } from './api/problem';

/** An act under way, what came of it, and how to start it. */
export interface Act<Input, Output> {
  /** Starts the act; does nothing while it is under way. Undefined when it was refused: see `problem`. */
  run: (input: Input) => Promise<Output | undefined>;
  busy: boolean;
  problem: ApiProblem | undefined;
  /** Forgets the problem, when the reader has corrected what was wrong. */
  clear: () => void;
}

/** Runs something at the API once at a time, and keeps what went wrong so that it can be said beside the button. */
export function useAct<Input, Output>(perform: (input: Input) => Promise<Output>): Act<Input, Output> {
  const running = useRef(false);
  const [busy, setBusy] = useState(false);
  const [problem, setProblem] = useState<ApiProblem>();
  const run = async (input: Input) => {
    if (running.current) return undefined;
    running.current = true;
    setBusy(true);
    setProblem(undefined);
    try {
      return await perform(input);
    } catch (error) {
      setProblem(asProblem(error));
      return undefined;
    } finally {
      running.current = false;
      setBusy(false);
    }
  };
  return { run, busy, problem, clear: () => setProblem(undefined) };
}
