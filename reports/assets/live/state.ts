/** What the reader has chosen; everything on the page listens to it. */
export interface State {
  /** Row of the trial picked, -1 for none. */
  readonly picked: number;
  /** Campaigns put in the background. */
  readonly hidden: readonly string[];
  readonly axes: 'as drawn' | 'linear';
}

export interface Store {
  readonly state: () => State;
  readonly set: (change: Partial<State>) => void;
  readonly listen: (hear: (state: State, change: Partial<State>) => void) => void;
}

/** A state with listeners. */
export function store(): Store {
  let state: State = { picked: -1, hidden: [], axes: 'as drawn' };
  const listeners: ((state: State, change: Partial<State>) => void)[] = [];
  return {
    state: () => state,
    set: (change) => {
      state = { ...state, ...change };
      for (const hear of listeners) hear(state, change);
    },
    listen: (hear) => {
      listeners.push(hear);
    },
  };
}
