/** A machine for the command line in memory: files that are there, and what was printed, said and written. */

import type { Io } from '../../../src/cli/io.ts';
import { main } from '../../../src/cli/main.ts';
import { ok, problem } from '../../../src/problem/index.ts';

export interface Machine {
  readonly files: Readonly<Record<string, string>>;
  readonly standardInput?: string;
  readonly isTerminal?: boolean;
}

export interface Outcome {
  readonly status: number;
  readonly printed: string | Uint8Array;
  readonly complaints: readonly string[];
  readonly written: ReadonlyMap<string, string | Uint8Array>;
}

/** Runs the command line with these arguments on that machine. */
export async function runOn(machine: Machine, ...argv: readonly string[]): Promise<Outcome> {
  const printed: (string | Uint8Array)[] = [];
  const complaints: string[] = [];
  const written = new Map<string, string | Uint8Array>();
  const io: Io = {
    isTerminal: machine.isTerminal ?? false,
    readFile: async path => {
      const text = machine.files[path];
      return text === undefined ? { ok: false, problems: [problem('not-readable', `${path}: gone.`)] } : ok(text);
    },
    readStandardInput: async () => ok(machine.standardInput ?? ''),
    print: async content => {
      printed.push(content);
    },
    complain: line => complaints.push(line),
    replaceFile: async (path, content) => {
      written.set(path, content);
      return ok(null);
    },
  };
  const status = await main(argv, io);
  const [first] = printed;
  const whole = printed.length === 1 && first instanceof Uint8Array ? first : printed.map(String).join('');
  return { status, printed: whole, complaints, written };
}
