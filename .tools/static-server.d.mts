/** Types of static-server.mjs for the browser tests. */
export function policyOf(html: string): string;
export function serve(
  folder: string,
  where: { readonly port: number; readonly host: string },
): Promise<{ readonly port: number; readonly close: () => Promise<void> }>;
