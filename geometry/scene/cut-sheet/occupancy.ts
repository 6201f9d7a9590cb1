/** A box of the page, px. */
export interface Room {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** Boxes of the page that are taken already. */
export class Occupancy {
  private readonly rooms: Room[] = [];

  add(room: Room): void {
    this.rooms.push(room);
  }

  /** Square px of the room that are taken. */
  overlap(room: Room): number {
    return this.rooms.reduce((sum, other) => sum + shared(room, other), 0);
  }

  /** The first of the rooms that touches nothing, else the one that touches least. */
  freest(rooms: readonly Room[]): Room {
    return rooms.reduce((best, next) => (this.overlap(next) < this.overlap(best) - 1e-6 ? next : best));
  }
}

function shared(a: Room, b: Room): number {
  const width = Math.min(a.right, b.right) - Math.max(a.left, b.left);
  const height = Math.min(a.bottom, b.bottom) - Math.max(a.top, b.top);
  return width > 0 && height > 0 ? width * height : 0;
}
