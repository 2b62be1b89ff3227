/**
 * Plots as drawings: the answer to a step and the map of poles and zeros, each on the screen and as an SVG file that needs
 * no DOM to be made.
 */

import './plots.css';

export type { Axis, Tick } from './axis.ts';
export { axisMeasure, axisOver, steadyDomain } from './axis.ts';
export { type Band, bandPath } from './band-path.ts';
export type { Samples } from './curve-path.ts';
export { curvePath, nearestSample } from './curve-path.ts';
export type { Drawing, Size } from './drawing.ts';
export { line, plotFileName, round, svgFile, TEXT_SIZE, text, tickStyle } from './drawing.ts';
export { PlotMarks } from './PlotMarks.tsx';
export { PoleMap } from './PoleMap.tsx';
export type { Palette } from './palette.ts';
export { FILE, SCREEN } from './palette.ts';
export { poleMapDrawing } from './pole-map-drawing.ts';
export type { MapView } from './pole-map-frame.ts';
export type { SavedPlot } from './StepPlot.tsx';
export { StepPlot } from './StepPlot.tsx';
export type { StepContent, StepCurve } from './step-content.ts';
export { stepSummary } from './step-content.ts';
export { stepDrawing } from './step-drawing.ts';
