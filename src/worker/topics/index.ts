/** What is asked of the model on demand, a topic a file. */

export type { Response, ResponseQuestion } from './response.ts';
export type { SymbolEntry, Symbols } from './symbols.ts';
export type { Patience, Subject, Topic, TopicModule } from './topic.ts';
export { TOPIC_MODULES } from './topic-modules.ts';
export type { TopicAnswer, TopicName, TopicQuestion, Topics } from './topics.ts';
export type { TraceAnswer, TraceQuestion } from './trace.ts';
export type { TransferMatrix } from './transfer-matrix.ts';
