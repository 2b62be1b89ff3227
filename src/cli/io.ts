/** What the command line asks of the machine; `node-io.ts` is the machine itself, tests bring their own. */

import type { Result } from '../problem/index.ts';

export interface Io {
  /** Whether standard output goes to a person's terminal. */
  readonly isTerminal: boolean;
  /** Text of a file, read as UTF-8; refused (`not-readable`, `too-large`) with a message that names the file. */
  readonly readFile: (path: string) => Promise<Result<string>>;
  readonly readStandardInput: () => Promise<Result<string>>;
  /** Writes to standard output; resolves once it is on its way or nobody reads it any more. */
  readonly print: (content: string | Uint8Array) => Promise<void>;
  /** Writes a line to standard error. */
  readonly complain: (line: string) => void;
  /** Writes a whole file; an existing one is replaced only once the new one is complete, and stays where that fails. */
  readonly replaceFile: (path: string, content: string | Uint8Array) => Promise<Result<null>>;
}
