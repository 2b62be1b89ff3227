/**
 * Wires as orthogonal routes with their branching points. `routeWires` for a whole sheet, `rerouteMoved` after a move,
 * `elbowRoute` while something is being dragged. Pure functions of the sheet and its geometry.
 */

export { ownParts } from './branching-points.ts';
export { elbowRoute } from './elbow-route.ts';
export { rerouteMoved, routeWires } from './route-wires.ts';
export type { PortEnd, Route, Routes, WireRoute } from './types.ts';
export { wireKey } from './types.ts';
