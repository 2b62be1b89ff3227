/**
 * The table of tabs under the system matrix. A tab's view is loaded when it is first shown; it finds what it shows itself, in the
 * store or by asking the worker (ui/answers). Adding one is a line here and a component of its own.
 */

import { type ComponentType, type LazyExoticComponent, lazy } from 'react';
import { TimeView } from './TimeView.tsx';

export interface ResultTab {
  readonly id: string;
  /** On the tab. */
  readonly label: string;
  /** Over the panel. */
  readonly title: string;
  /** Whether the panel is about the channel that the picker over it chooses. */
  readonly isOfChannel: boolean;
  readonly View: ComponentType | LazyExoticComponent<ComponentType>;
}

export const RESULT_TABS: readonly [ResultTab, ...ResultTab[]] = [
  { id: 'time', label: 'Time', title: 'Time response', isOfChannel: true, View: TimeView },
  {
    id: 'frequency',
    label: 'Frequency',
    title: 'Frequency response',
    isOfChannel: true,
    View: lazy(() => import('./FrequencyTab.tsx').then(file => ({ default: file.FrequencyTab }))),
  },
  {
    id: 'transfer',
    label: 'Transfer',
    title: 'All transfer functions',
    isOfChannel: false,
    View: lazy(() => import('./TransferMatrixTab.tsx').then(file => ({ default: file.TransferMatrixTab }))),
  },
  {
    id: 'structure',
    label: 'Structure',
    title: 'Structure',
    isOfChannel: false,
    View: lazy(() => import('../structure/index.ts').then(room => ({ default: room.StructureTab }))),
  },
  {
    id: 'requirements',
    label: 'Requirements',
    title: 'Requirements',
    isOfChannel: false,
    View: lazy(() => import('../requirements/index.ts').then(room => ({ default: room.RequirementsTab }))),
  },
  {
    id: 'workings',
    label: 'Workings',
    title: 'Workings',
    isOfChannel: false,
    View: lazy(() => import('../workings/index.ts').then(room => ({ default: room.WorkingsTab }))),
  },
];
