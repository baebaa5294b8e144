import type { Io } from "./Io.ts";

/** Exit codes, the same for every command. */
export const EXIT = { done: 0, contentErrors: 1, wrongUse: 2, unexpected: 3 } as const;

export interface CommandOption {
  readonly name: string;
  /** Word for the value in the help; absent for a flag. */
  readonly value?: string;
  readonly fallback?: string;
  readonly help: string;
}

/** One command: what the help says of it, and what it does. */
export interface Command {
  readonly name: string;
  /** One line for the list of commands. */
  readonly summary: string;
  /** Whole sentences for its own help. */
  readonly details: string;
  readonly argument?: {
    readonly name: string;
    readonly allowed: readonly string[];
    readonly fallback: string;
  };
  readonly options: readonly CommandOption[];
  readonly run: (given: Given, io: Io) => Promise<number>;
}

export interface Given {
  readonly options: Readonly<Record<string, string>>;
  readonly argument: string;
}
