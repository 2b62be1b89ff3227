/** Names of parameters as a language allows them: one that it keeps for itself gets an underscore, so that no two become one. */

/** Python 3 keywords (The Python Language Reference, 2.3.1), soft ones that may stand as names left out, and what the module uses. */
const PYTHON = [
  ...'False None True and as assert async await break class continue def del elif else except finally for from global if import in'.split(
    ' ',
  ),
  ...'is lambda nonlocal not or pass raise return try while with yield'.split(' '),
  ...'math np abs min max matrices STATES INPUTS OUTPUTS INITIAL_STATE'.split(' '),
];

/** C keywords (ISO/IEC 9899:2018, 6.4.1, and those that C23 adds), macros of math.h, and what the source uses. */
const C = [
  ...'alignas alignof auto bool break case char const constexpr continue default do double else enum extern false float for goto if'.split(
    ' ',
  ),
  ...'inline int long nullptr register restrict return short signed sizeof static static_assert struct switch thread_local true'.split(
    ' ',
  ),
  ...'typedef typeof typeof_unqual union unsigned void volatile while asm fortran'.split(' '),
  ...'NAN INFINITY HUGE_VAL HUGE_VALF HUGE_VALL FP_NAN FP_INFINITE FP_ZERO FP_SUBNORMAL FP_NORMAL MATH_ERRNO'.split(
    ' ',
  ),
  ...'isnan isinf isfinite isnormal signbit fpclassify math_errhandling'.split(' '),
  ...'A B C D p fabs pow log fmin fmax STATE_COUNT INPUT_COUNT OUTPUT_COUNT matrices parameters as_drawn initial_state'.split(
    ' ',
  ),
];

/** How each name is spelled in Python. */
export function pythonNames(names: readonly string[]): ReadonlyMap<string, string> {
  return legalNames(names, new Set(PYTHON));
}

/** How each name is spelled in C. */
export function cNames(names: readonly string[]): ReadonlyMap<string, string> {
  return legalNames(names, new Set(C));
}

function legalNames(names: readonly string[], kept: ReadonlySet<string>): ReadonlyMap<string, string> {
  const taken = new Set(names.filter(name => !kept.has(name)));
  const spelled = new Map<string, string>();
  for (const name of names) {
    let legal = name;
    if (kept.has(name)) {
      do legal += '_';
      while (kept.has(legal) || taken.has(legal));
      taken.add(legal);
    }
    spelled.set(name, legal);
  }
  return spelled;
}
