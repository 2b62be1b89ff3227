/** The standing caution: it goes wherever somebody could act on a result, word for word the same. */

export const CAUTION =
  'Linear model, only as good as the drawing: verify on the machine within its limits, keep independent protection in place, ' +
  'follow local codes and the functional-safety standards that apply (IEC 61508, ISO 13849, IEC 61511), and leave the ' +
  'sign-off to licensed practice.';
