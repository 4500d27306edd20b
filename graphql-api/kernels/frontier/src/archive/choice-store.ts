/**
 * The chosen options of many portfolios, one slot each, in as few bytes as the largest class allows: what is stored
 * is an option's place within its class. Room is taken page by page, so that growing copies nothing and wastes
 * little: 50 000 portfolios over 2 000 classes take 100 MB.
 */
export class ChoiceStore {
  private readonly classCount: number;
  private readonly Page: typeof Uint8Array | typeof Uint16Array | typeof Int32Array;
  private readonly pages: (Uint8Array | Uint16Array | Int32Array)[] = [];
  /** A page holds two to this power slots, for about PAGE_LENGTH choices. */
  private readonly pageBits: number;

  /** @param optionStart the options of class k are those from optionStart[k] up to optionStart[k + 1] */
  constructor(private readonly optionStart: Int32Array) {
    this.classCount = optionStart.length - 1;
    this.pageBits = Math.max(0, Math.round(Math.log2(PAGE_LENGTH / Math.max(1, this.classCount))));
    let largest = 0;
    for (let k = 0; k < this.classCount; k++)
      largest = Math.max(largest, optionStart[k + 1] - optionStart[k]);
    this.Page = largest <= 1 << 8 ? Uint8Array : largest <= 1 << 16 ? Uint16Array : Int32Array;
  }

  /** Takes the option of each class into a slot. Slots are to be used from 0 on without gaps. */
  put(slot: number, chosen: Int32Array): void {
    const { classCount, optionStart, pageBits } = this;
    const page = (this.pages[slot >> pageBits] ??= new this.Page(classCount << pageBits));
    const start = (slot - ((slot >> pageBits) << pageBits)) * classCount;
    for (let k = 0; k < classCount; k++) page[start + k] = chosen[k] - optionStart[k];
  }

  /** Writes the option of each class into `chosen` and returns it. */
  get(slot: number, chosen: Int32Array): Int32Array {
    const { classCount, optionStart, pageBits } = this;
    const page = this.pages[slot >> pageBits];
    const start = (slot - ((slot >> pageBits) << pageBits)) * classCount;
    for (let k = 0; k < classCount; k++) chosen[k] = optionStart[k] + page[start + k];
    return chosen;
  }
}

const PAGE_LENGTH = 1 << 17;
