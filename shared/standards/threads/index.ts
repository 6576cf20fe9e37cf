export { parseThread, formatThread } from './parse-thread';
export { classSide, internalThreadLimits, threadLimits } from './limits';
export type { ExternalThreadLimits, InternalThreadLimits } from './limits';
export type { Hand, Limits, ParsedThread, ThreadSeries, ThreadSpec } from './thread-spec';
