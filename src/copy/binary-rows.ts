const signature = Buffer.from('PGCOPY\n\xff\r\n\0', 'latin1');
const header = Buffer.concat([signature, Buffer.alloc(8)]);
const trailer = Buffer.from([0xff, 0xff]);

/**
 * Writes rows in PostgreSQL's binary COPY format into large buffers. Binary, because reading float8 from text dominates
 * the server's side of a text COPY (measured: 2.4 times slower).
 */
export class BinaryRows {
  private buffer: Buffer;
  private at = 0;

  constructor(private readonly size = 1 << 20) {
    this.buffer = Buffer.allocUnsafe(size);
    this.bytes(header);
  }

  row(fields: number): void {
    this.room(2);
    this.at = this.buffer.writeInt16BE(fields, this.at);
  }

  null(): void {
    this.room(4);
    this.at = this.buffer.writeInt32BE(-1, this.at);
  }

  float8(value: number | null): void {
    if (value === null || Number.isNaN(value)) return this.null();
    this.room(12);
    this.at = this.buffer.writeInt32BE(8, this.at);
    this.at = this.buffer.writeDoubleBE(value, this.at);
  }

  int4(value: number): void {
    this.room(8);
    this.at = this.buffer.writeInt32BE(4, this.at);
    this.at = this.buffer.writeInt32BE(value, this.at);
  }

  int2(value: number): void {
    this.room(6);
    this.at = this.buffer.writeInt32BE(2, this.at);
    this.at = this.buffer.writeInt16BE(value, this.at);
  }

  bool(value: boolean): void {
    this.room(5);
    this.at = this.buffer.writeInt32BE(1, this.at);
    this.at = this.buffer.writeUInt8(value ? 1 : 0, this.at);
  }

  text(value: string | null): void {
    if (value === null) return this.null();
    const length = Buffer.byteLength(value);
    this.room(4 + length);
    this.at = this.buffer.writeInt32BE(length, this.at);
    this.at += this.buffer.write(value, this.at);
  }

  uuid(value: Buffer): void {
    this.room(20);
    this.at = this.buffer.writeInt32BE(16, this.at);
    this.bytes(value);
  }

  /** True when it is time to take(). */
  get isFull(): boolean {
    return this.at >= this.size - 4096;
  }

  take(): Buffer {
    const taken = this.buffer.subarray(0, this.at);
    this.buffer = Buffer.allocUnsafe(this.size);
    this.at = 0;
    return taken;
  }

  end(): Buffer {
    this.bytes(trailer);
    return this.take();
  }

  private bytes(value: Buffer): void {
    this.room(value.length);
    this.at += value.copy(this.buffer, this.at);
  }

  private room(bytes: number): void {
    if (this.at + bytes <= this.buffer.length) return;
    const larger = Buffer.allocUnsafe(Math.max(this.buffer.length * 2, this.at + bytes));
    this.buffer.copy(larger, 0, 0, this.at);
    this.buffer = larger;
  }
}

export const uuidBytes = (uuid: string): Buffer => Buffer.from(uuid.replaceAll('-', ''), 'hex');
