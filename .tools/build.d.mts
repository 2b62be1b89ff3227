/** Types of build.mjs for the browser tests. */
export function buildPage(options: { readonly show: boolean }): Promise<boolean>;
export function buildCommandLine(options: { readonly show: boolean }): Promise<boolean>;
