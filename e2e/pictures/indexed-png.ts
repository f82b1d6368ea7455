import { crc32, deflateSync } from 'node:zlib';

const SIGNATURE = Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]);
const MOST_COLOURS = 256;
/** From black to white, squared. */
const FARTHEST = 3 * 255 ** 2;

/** A picture as a browser's canvas gives it: four bytes a pixel (red, green, blue, opacity), row by row. */
export interface Pixels {
  width: number;
  height: number;
  data: Uint8Array;
}

/**
 * Writes a picture as a PNG of at most 256 colours, which takes a third of the bytes and shows on a screen of text and
 * lines no difference that one would see. A colour too many becomes the nearest of the 256. Opacity
 * is left out: a picture of a page has none.
 */
export function indexedPng({ width, height, data }: Pixels): Buffer {
  const colourAt = (pixel: number): number =>
    ((data[pixel * 4] ?? 0) << 16) | ((data[pixel * 4 + 1] ?? 0) << 8) | (data[pixel * 4 + 2] ?? 0);
  const palette = chooseColours(width * height, colourAt);
  const placeOf = nearestIn(palette);
  // Each row begins with the kind of its filter; rows of a palette compress best without one (0).
  const rows = Buffer.alloc(height * (width + 1));
  for (let y = 0; y < height; y += 1) {
    for (let x = 0; x < width; x += 1) rows[y * (width + 1) + 1 + x] = placeOf(colourAt(y * width + x));
  }
  const header = Buffer.alloc(13);
  header.writeUInt32BE(width, 0);
  header.writeUInt32BE(height, 4);
  // Eight bits a pixel, each a place in the palette (colour type 3).
  header.set([8, 3, 0, 0, 0], 8);
  const colours = Buffer.from(palette.flatMap((colour) => [colour >> 16, (colour >> 8) & 255, colour & 255]));
  return Buffer.concat([
    SIGNATURE,
    chunk('IHDR', header),
    chunk('PLTE', colours),
    chunk('IDAT', deflateSync(rows, { level: 9, memLevel: 9 })),
    chunk('IEND', Buffer.alloc(0)),
  ]);
}

/**
 * The colours that stand for the others best: each next one is where most is wrong so far, by how often a colour is
 * used and how far it is from any chosen one, so that a rare but bright colour of a band is kept.
 */
function chooseColours(count: number, colourAt: (pixel: number) => number): number[] {
  const uses = new Map<number, number>();
  for (let pixel = 0; pixel < count; pixel += 1) {
    const colour = colourAt(pixel);
    uses.set(colour, (uses.get(colour) ?? 0) + 1);
  }
  const candidates = [...uses].map(([colour, used]) => ({ colour, used, away: Infinity }));
  const chosen: number[] = [];
  while (chosen.length < Math.min(MOST_COLOURS, candidates.length)) {
    const wrong = ({ used, away }: { used: number; away: number }): number => used * Math.min(away, FARTHEST);
    const next = candidates.reduce((worst, each) => (wrong(each) > wrong(worst) ? each : worst));
    chosen.push(next.colour);
    for (const each of candidates) each.away = Math.min(each.away, distance(each.colour, next.colour));
  }
  return chosen;
}

function nearestIn(palette: readonly number[]): (colour: number) => number {
  const places = new Map(palette.map((colour, place) => [colour, place]));
  return (colour) => {
    const known = places.get(colour);
    if (known !== undefined) return known;
    let nearest = 0;
    palette.forEach((each, place) => {
      if (distance(each, colour) < distance(palette[nearest] ?? 0, colour)) nearest = place;
    });
    places.set(colour, nearest);
    return nearest;
  };
}

function distance(one: number, other: number): number {
  const channel = (shift: number): number => (((one >> shift) & 255) - ((other >> shift) & 255)) ** 2;
  return channel(16) + channel(8) + channel(0);
}

function chunk(type: string, contents: Buffer): Buffer {
  const body = Buffer.concat([Buffer.from(type, 'latin1'), contents]);
  const length = Buffer.alloc(4);
  length.writeUInt32BE(contents.length);
  const check = Buffer.alloc(4);
  check.writeUInt32BE(crc32(body));
  return Buffer.concat([length, body, check]);
}
