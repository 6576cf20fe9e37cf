import type { Register } from './register';
import {
  CHUCKS,
  COLLET_BLOCKS,
  COLLET_SETS,
  DIVIDING_HEADS,
  LATHES,
  MILLS,
  SAWS,
} from './example-shop/machines';
import { INSTRUMENTS } from './example-shop/instruments';
import { BARS } from './example-shop/rack';
import { TOOLS } from './example-shop/tools';

/** The built-in example shop: the depot of the invented canal Pellworth Navigation. */
export const exampleRegister: Register = {
  schemaVersion: 1,
  lathes: LATHES,
  mills: MILLS,
  saws: SAWS,
  chucks: CHUCKS,
  colletSets: COLLET_SETS,
  colletBlocks: COLLET_BLOCKS,
  dividingHeads: DIVIDING_HEADS,
  tools: TOOLS,
  instruments: INSTRUMENTS,
  bars: BARS,
  settings: {
    currency: 'GBP',
    labourPerHour: 32,
    instrumentRatio: 0.25,
    dieLimit: 16,
    surfaceTexture: 'Ra 3.2',
  },
};
