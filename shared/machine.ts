import { Problem } from './problem.ts';

/** Who may cause an event: a part played in the record, never a person. */
interface Step<State extends string, Role extends string> {
  readonly to: State;
  readonly by: readonly Role[];
}

type Table<State extends string, Role extends string> = {
  readonly [S in State]: Readonly<Record<string, Step<State, Role>>>;
};

type EventOf<T> = { [S in keyof T]: keyof T[S] }[keyof T] & string;

export interface Machine<State extends string, Event extends string, Role extends string> {
  readonly states: readonly State[];
  /** Where the event leads, or a `wrong-state` or `not-permitted` problem. */
  next: (state: State, event: Event, role: Role) => State;
  /** The events this part may cause now, in the order of the table. */
  events: (state: State, role: Role) => Event[];
  isFinal: (state: State) => boolean;
  readonly table: Table<State, Role>;
}

/** Builds a state machine from its transition table: state → event → `{ to, by }`. */
export function machine<Role extends string>() {
  return <const T extends Table<keyof T & string, Role>>(
    table: T,
  ): Machine<keyof T & string, EventOf<T>, Role> => {
    type State = keyof T & string;
    type Event = EventOf<T>;
    const step = (state: State, event: Event): Step<State, Role> | undefined =>
      (table[state] as Readonly<Record<string, Step<State, Role>>>)[event];
    return {
      table,
      states: Object.keys(table) as State[],
      next: (state, event, role) => {
        const found = step(state, event);
        if (!found)
          throw new Problem('wrong-state', `Not possible while this is ${state.replaceAll('-', ' ')}.`);
        if (!found.by.includes(role)) throw new Problem('not-permitted');
        return found.to;
      },
      events: (state, role) =>
        (Object.keys(table[state]) as Event[]).filter(
          (event) => step(state, event)?.by.includes(role) ?? false,
        ),
      isFinal: (state) => Object.keys(table[state]).length === 0,
    };
  };
}
