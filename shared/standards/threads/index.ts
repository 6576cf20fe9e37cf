export { parseThread, formatThread } from './parse-thread';
export type { Hand, Limits, ParsedThread, ThreadSeries, ThreadSpec } from './thread-spec';
