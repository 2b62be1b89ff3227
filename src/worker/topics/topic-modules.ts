/** Where the worker loads each topic from, on its first question. */

import type { TopicModule } from './topic.ts';
import type { TopicName, Topics } from './topics.ts';

export const TOPIC_MODULES: { readonly [T in TopicName]: () => Promise<TopicModule<Topics[T]>> } = {
  response: () => import('./response.ts'),
  symbols: () => import('./symbols.ts'),
  requirements: () => import('./requirements.ts'),
  structure: () => import('./structure.ts'),
  trace: () => import('./trace.ts'),
  workings: () => import('./workings.ts'),
  'transfer-matrix': () => import('./transfer-matrix.ts'),
};
