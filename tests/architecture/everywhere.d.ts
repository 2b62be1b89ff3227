/**
 * What the core may use beside the language: the few globals that Node and every browser share. The core is checked against
 * these alone (tsconfig.core.json), without the DOM and without Node, so that anything else is an error of types.
 */

declare class TextEncoder {
  encode(text?: string): Uint8Array<ArrayBuffer>;
}

declare class TextDecoder {
  constructor(label?: string, options?: { fatal?: boolean; ignoreBOM?: boolean });
  decode(bytes?: Uint8Array): string;
}
