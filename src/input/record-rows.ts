import { GrowingColumn } from './growing-column.ts';
import type { ChannelQuantity } from './record-columns.ts';

/** The rows of a record as they are read, file by file. */
export class RecordRows {
  /** Time of each row [ms on the record's clock]. */
  readonly times: GrowingColumn;
  /** Value in each row [°C, W/m² or m/s], `NaN` where missing; the channels of the first file. */
  readonly channels = new Map<string, GrowingColumn>();
  readonly quantities = new Map<string, ChannelQuantity>();
  /** Row that each file begins with. */
  readonly fileStarts: number[] = [];
  private readonly expected: number;

  /** @param expected about how many rows there will be */
  constructor(expected: number) {
    this.expected = expected;
    this.times = new GrowingColumn(expected);
  }

  addChannel(name: string, quantity: ChannelQuantity): void {
    this.channels.set(name, new GrowingColumn(this.expected));
    this.quantities.set(name, quantity);
  }
}
