/** The address of the worker's script, from the build (vite.config.ts, `sharedWorker`). */
declare module 'virtual:derivation-worker' {
  const address: string;
  export default address;
}
