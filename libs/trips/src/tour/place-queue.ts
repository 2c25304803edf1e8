/** Places waiting to be looked at, first come first served, each at most once. */
export class PlaceQueue {
  private readonly places: Int32Array;
  private readonly waiting: Uint8Array;
  private head = 0;
  private count = 0;

  constructor(private readonly size: number) {
    this.places = new Int32Array(size);
    this.waiting = new Uint8Array(size);
  }

  /** Puts a place at the end, unless it waits already. */
  push(place: number): void {
    if (this.waiting[place]) return;
    this.waiting[place] = 1;
    this.places[(this.head + this.count) % this.size] = place;
    this.count++;
  }

  /** Takes the first place, or undefined when none waits. */
  pop(): number | undefined {
    if (this.count === 0) return undefined;
    const place = this.places[this.head] as number;
    this.head = (this.head + 1) % this.size;
    this.count--;
    this.waiting[place] = 0;
    return place;
  }
}
