/** The table of topics: their types for both ends of the line. Where each is loaded from stands in topic-modules.ts. */

import type { RequirementsTopic } from './requirements.ts';
import type { ResponseTopic } from './response.ts';
import type { StructureTopic } from './structure.ts';
import type { SymbolsTopic } from './symbols.ts';
import type { TraceTopic } from './trace.ts';
import type { TransferMatrixTopic } from './transfer-matrix.ts';
import type { WorkingsTopic } from './workings.ts';

export interface Topics {
  readonly response: ResponseTopic;
  readonly symbols: SymbolsTopic;
  readonly requirements: RequirementsTopic;
  readonly structure: StructureTopic;
  readonly trace: TraceTopic;
  readonly workings: WorkingsTopic;
  readonly 'transfer-matrix': TransferMatrixTopic;
}

export type TopicName = keyof Topics;
export type TopicQuestion<T extends TopicName> = Topics[T]['question'];
export type TopicAnswer<T extends TopicName> = Topics[T]['answer'];
