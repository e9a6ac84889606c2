/**
 * Rows in PostgreSQL's binary COPY format, gathered in one buffer that is handed over whole: numbers go as they are in
 * memory, so neither side spends time on decimal digits.
 */
const SIGNATURE = Buffer.from('PGCOPY\n\xff\r\n\0\0\0\0\0\0\0\0\0', 'latin1');
/** 2000-01-01T00:00Z, where PostgreSQL counts from. */
const EPOCH_MS = 946_684_800_000;
const TWO_32 = 4_294_967_296;
const FIRST_BYTES = 262_144;
const WORTH_BYTES = 65_536;
/** Length and eight bytes. */
const LONGEST_NUMBER = 12;

export class CopyRows {
  private buffer = Buffer.allocUnsafeSlow(FIRST_BYTES);
  private view = new DataView(this.buffer.buffer);
  private end = SIGNATURE.copy(this.buffer);

  /** Every row begins so; as many fields must follow. There is room for all of them but texts. */
  begin(fieldCount: number): void {
    this.room(2 + fieldCount * LONGEST_NUMBER);
    this.view.setInt16(this.end, fieldCount);
    this.end += 2;
  }

  nothing(): void {
    this.view.setInt32(this.end, -1);
    this.end += 4;
  }

  int(value: number): void {
    this.view.setInt32(this.end, 4);
    this.view.setInt32(this.end + 4, value);
    this.end += 8;
  }

  instant(atMs: number): void {
    const micros = (atMs - EPOCH_MS) * 1000;
    const high = Math.floor(micros / TWO_32);
    this.view.setInt32(this.end, 8);
    this.view.setInt32(this.end + 4, high);
    this.view.setUint32(this.end + 8, micros - high * TWO_32);
    this.end += 12;
  }

  double(value: number): void {
    this.view.setInt32(this.end, 8);
    this.view.setFloat64(this.end + 4, value);
    this.end += 12;
  }

  /** PostgreSQL's text holds no NUL. Leaves room for the numbers of a row behind it. */
  text(value: string): void {
    this.room(value.length * 3 + 64 * LONGEST_NUMBER);
    const clean = value.includes('\0') ? value.replaceAll('\0', '\uFFFD') : value;
    const bytes = this.buffer.write(clean, this.end + 4, 'utf8');
    this.view.setInt32(this.end, bytes);
    this.end += 4 + bytes;
  }

  get isWorthSending(): boolean {
    return this.end >= WORTH_BYTES;
  }

  /** What has been gathered, to be sent; a new buffer is begun. */
  take(): Buffer {
    const taken = this.buffer.subarray(0, this.end);
    this.use(Buffer.allocUnsafeSlow(FIRST_BYTES));
    this.end = 0;
    return taken;
  }

  /** The mark after the last row. */
  finish(): Buffer {
    this.room(2);
    this.view.setInt16(this.end, -1);
    this.end += 2;
    return this.take();
  }

  private use(buffer: Buffer<ArrayBuffer>): void {
    this.buffer = buffer;
    this.view = new DataView(buffer.buffer);
  }

  private room(bytes: number): void {
    if (this.end + bytes <= this.buffer.length) return;
    const larger = Buffer.allocUnsafeSlow((this.buffer.length + bytes) * 2);
    this.buffer.copy(larger, 0, 0, this.end);
    this.use(larger);
  }
}
