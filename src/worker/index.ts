/** The messages between the tab and the analyses, the switch that answers them, and the tab's end of the line. */

export type { Stimulus } from '../analysis/index.ts';
export { type JudgeRequest, type Judging, judgePoints } from './judge-points.ts';
export { type AnalysisLine, openLine } from './line.ts';
export type {
  Answer,
  Channel,
  ChannelAnswer,
  CutAnswer,
  CutLoop,
  CutsAnswer,
  FileAnswer,
  FrequencyAnswer,
  ModelAnswer,
  Notation,
  PolesAnswer,
  QuantityValues,
  Question,
  RevisionAnswer,
} from './protocol.ts';
export type {
  Response,
  ResponseQuestion,
  SymbolEntry,
  Symbols,
  TopicAnswer,
  TopicName,
  TopicQuestion,
  TraceAnswer,
  TraceQuestion,
  TransferMatrix,
} from './topics/index.ts';
