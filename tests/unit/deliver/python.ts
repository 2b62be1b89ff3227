/** Python with numpy and scipy, where the machine has them: a second reader that nobody here wrote. */

import { spawnSync } from 'node:child_process';

export const hasPython = spawnSync('python3', ['-c', 'import numpy, scipy.io'], { stdio: 'ignore' }).status === 0;

/** What a Python program prints as JSON; its arguments are in sys.argv. */
export function python(program: string, ...programArguments: string[]): unknown {
  const { status, stdout, stderr } = spawnSync('python3', ['-c', program, ...programArguments], { encoding: 'utf8' });
  if (status !== 0) throw new Error(stderr);
  return JSON.parse(stdout);
}
