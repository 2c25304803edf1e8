import type { Clock, Random } from './clock';
import type { Codec } from './codec';
import type { DeliveryStore } from './store';
import type { Transport } from './transport';

/** Claims of a receipt, and whether its signature is the office's. */
export interface ReceiptReading {
  device: string;
  acknowledgedThrough: number;
  hash: string;
  verified: boolean;
}

/** Everything that delivery needs from its host: the phone's page, or the simulation. */
export interface DeliveryPorts {
  clock: Clock;
  random: Random;
  codec: Codec;
  store: DeliveryStore;
  transport: Transport;
  /** A fault of the phone itself that ended a round; for the record, delivery goes on. */
  noteFault: (error: unknown) => void;
  /** Null when the text is no receipt at all. */
  readReceipt: (receipt: string) => Promise<ReceiptReading | null>;
}
