/**
 * Draws the icons and writes assets/icon-16.png and so on: `node scripts/icons.mjs`.
 *
 * The drawing is ours: a reaction's falling curve with its tangent, on a plain tile. No picture library:
 * each pixel is sampled 8 × 8 times and the PNG is written by hand (ISO/IEC 15948).
 */
import { mkdirSync, writeFileSync } from 'node:fs';
import { crc32 as zlibCrc32, deflateSync } from 'node:zlib';

const sizes = [16, 32, 64, 80];
const samples = 8;

const tile = [23, 92, 102];
const curveInk = [251, 250, 246];
const tangentInk = [247, 178, 106];

/** The drawing lives in a unit square, y downwards. Strokes thicken as the icon shrinks, to stay visible. */
const stroke = (size) => 0.058 + 0.5 / size;

const [left, right, fall, pace] = [0.17, 0.87, 0.68, 0.19];
const shareLeft = (x) => Math.exp(-(x - left) / pace);
const curveAt = (x) => 0.86 - fall * shareLeft(x);
const fallingCurve = Array.from({ length: 60 }, (_, i) => left + ((right - left) * i) / 59).map((x) => [
  x,
  curveAt(x),
]);

const touch = 0.36;
const slope = (fall / pace) * shareLeft(touch);
const tangent = [-0.2, 0.2].map((step) => [touch + step, curveAt(touch) + slope * step]);

function distanceToSegment([px, py], [ax, ay], [bx, by]) {
  const [dx, dy] = [bx - ax, by - ay];
  const along = ((px - ax) * dx + (py - ay) * dy) / (dx * dx + dy * dy);
  const share = Math.min(1, Math.max(0, along));
  return Math.hypot(px - ax - share * dx, py - ay - share * dy);
}

function distanceToPath(point, path) {
  let nearest = Infinity;
  for (let i = 1; i < path.length; i++)
    nearest = Math.min(nearest, distanceToSegment(point, path[i - 1], path[i]));
  return nearest;
}

function isInTile([x, y]) {
  const [edge, radius] = [0.5, 0.2];
  const [dx, dy] = [Math.abs(x - 0.5) - (edge - radius), Math.abs(y - 0.5) - (edge - radius)];
  return Math.hypot(Math.max(dx, 0), Math.max(dy, 0)) <= radius;
}

/** Colour at one point, or nothing outside the tile. */
function inkAt(point, size) {
  if (!isInTile(point)) return null;
  if (distanceToPath(point, tangent) < stroke(size) * 0.42) return tangentInk;
  return distanceToPath(point, fallingCurve) < stroke(size) * 0.55 ? curveInk : tile;
}

function pixel(column, row, size) {
  const sum = [0, 0, 0];
  let hits = 0;
  for (let s = 0; s < samples * samples; s++) {
    const x = (column + ((s % samples) + 0.5) / samples) / size;
    const y = (row + (Math.floor(s / samples) + 0.5) / samples) / size;
    const ink = inkAt([x, y], size);
    if (!ink) continue;
    hits++;
    ink.forEach((part, i) => (sum[i] += part));
  }
  if (hits === 0) return [0, 0, 0, 0];
  return [...sum.map((part) => Math.round(part / hits)), Math.round((255 * hits) / samples ** 2)];
}

function chunk(type, data) {
  const body = Buffer.concat([Buffer.from(type, 'latin1'), data]);
  const framed = Buffer.alloc(body.length + 8);
  framed.writeUInt32BE(data.length, 0);
  body.copy(framed, 4);
  framed.writeUInt32BE(crc32(body), body.length + 4);
  return framed;
}

/** Node 20 below 20.15 has no crc32 of its own. */
function crc32(bytes) {
  if (zlibCrc32) return zlibCrc32(bytes);
  let crc = ~0;
  for (const byte of bytes) {
    crc ^= byte;
    for (let bit = 0; bit < 8; bit++) crc = (crc >>> 1) ^ (crc & 1 ? 0xedb88320 : 0);
  }
  return ~crc >>> 0;
}

/** 8-bit RGBA, no interlace, no filter. */
function png(size) {
  const header = Buffer.alloc(13);
  header.writeUInt32BE(size, 0);
  header.writeUInt32BE(size, 4);
  header.set([8, 6, 0, 0, 0], 8);
  const rows = Array.from({ length: size }, (_, row) =>
    Buffer.from([0, ...Array.from({ length: size }, (_, column) => pixel(column, row, size)).flat()]),
  );
  return Buffer.concat([
    Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]),
    chunk('IHDR', header),
    chunk('IDAT', deflateSync(Buffer.concat(rows), { level: 9 })),
    chunk('IEND', Buffer.alloc(0)),
  ]);
}

const folder = new URL('../assets/', import.meta.url);
mkdirSync(folder, { recursive: true });
for (const size of sizes) writeFileSync(new URL(`icon-${size}.png`, folder), png(size));
