/** The messages between the tab and the analyses, the switch that answers them, and the tab's end of the line. */

export { type AnalysisLine, openLine } from './line.ts';
export type {
  Answer,
  Channel,
  ChannelAnswer,
  FileAnswer,
  ModelAnswer,
  Notation,
  PolesAnswer,
  QuantityValues,
  Question,
} from './protocol.ts';
