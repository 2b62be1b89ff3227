/** Third pass: the algebraic loops, each a small linear system. */

export { type Components, type Graph, stronglyConnectedComponents } from './components.ts';
export { listTitles, loopWithoutSolution, nearlySingularLoop, pathsOf } from './loop-findings.ts';
export { type LoopSystem, loopSystem } from './loop-system.ts';
export { inDoubles, relativeDistanceToSingular } from './nearness.ts';
export { orderSignals, type SignalOrder } from './signal-loops.ts';
export { type LoopSolver, loopSolver } from './solve-loop.ts';
