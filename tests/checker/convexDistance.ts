/** A convex bar along z: corners x, y (two numbers each) of its profile, its ends, and a way that it is carried along (its sweep counts). */
export interface Bar {
  readonly profile: Float64Array;
  readonly from: number;
  readonly to: number;
  readonly sweepX: number;
  readonly sweepY: number;
}

/** Up to four corners of the difference of the two bodies, three numbers each. */
const simplex = new Float64Array(12);
let size = 0;
/** The point of the difference that is nearest to the origin so far. */
let vx = 0;
let vy = 0;
let vz = 0;
let wx = 0;
let wy = 0;
let wz = 0;

/** Share of the distance that a lower bound has to reach. */
const CLOSE_ENOUGH = 0.8;

/** The two bodies at hand: corners of the one, how much lower it stands, and a bar or the corners of the other. */
let one: Float64Array = new Float64Array(0);
let lowered = 0;
let bar: Bar | null = null;
let other: Float64Array = new Float64Array(0);

/**
 * Distance between a convex body (corners x, y, z in `points`) moved by (0, -lift, 0) and a bar, by the method of Gilbert, Johnson and
 * Keerthi (1988); 0 when they share something. Ends early, with a lower bound, once that is over `enough`, or over `near` and not much
 * under the distance. `axis`: the way between them when they were last asked about, where the search starts; it is written anew.
 */
export function convexDistance(points: Float64Array, lift: number, against: Bar, enough: number, axis: Float64Array | null = null, near = Infinity): number {
  one = points;
  lowered = lift;
  bar = against;
  return iterate(enough, axis, near);
}

/** The same between two convex bodies. */
export function bodyDistance(a: Float64Array, b: Float64Array, enough: number, axis: Float64Array | null = null, near = Infinity): number {
  one = a;
  lowered = 0;
  bar = null;
  other = b;
  return iterate(enough, axis, near);
}

/** The corner of the difference farthest along d: of the one along d, less that of the other against d. */
function support(dx: number, dy: number, dz: number): void {
  let best = -Infinity;
  let at = 0;
  for (let i = 0; i < one.length; i += 3) {
    const value = dx * (one[i] as number) + dy * (one[i + 1] as number) + dz * (one[i + 2] as number);
    if (value > best) { best = value; at = i; }
  }
  let least = Infinity;
  let on = 0;
  if (bar === null) {
    for (let i = 0; i < other.length; i += 3) {
      const value = dx * (other[i] as number) + dy * (other[i + 1] as number) + dz * (other[i + 2] as number);
      if (value < least) { least = value; on = i; }
    }
    wx = (one[at] as number) - (other[on] as number);
    wy = (one[at + 1] as number) - (other[on + 1] as number);
    wz = (one[at + 2] as number) - (other[on + 2] as number);
    return;
  }
  const { profile } = bar;
  for (let i = 0; i < profile.length; i += 2) {
    const value = dx * (profile[i] as number) + dy * (profile[i + 1] as number);
    if (value < least) { least = value; on = i; }
  }
  const carried = dx * bar.sweepX + dy * bar.sweepY < 0 ? 1 : 0;
  wx = (one[at] as number) - (profile[on] as number) - carried * bar.sweepX;
  wy = (one[at + 1] as number) - lowered - (profile[on + 1] as number) - carried * bar.sweepY;
  wz = (one[at + 2] as number) - (dz > 0 ? bar.from : bar.to);
}

function iterate(enough: number, axis: Float64Array | null, near: number): number {
  if (axis === null || (axis[0] === 0 && axis[1] === 0 && axis[2] === 0)) support(1, 0, 0);
  else support(-(axis[0] as number), -(axis[1] as number), -(axis[2] as number));
  vx = wx; vy = wy; vz = wz;
  simplex[0] = wx; simplex[1] = wy; simplex[2] = wz;
  size = 1;
  const found = search(enough, near);
  if (axis !== null) { axis[0] = vx; axis[1] = vy; axis[2] = vz; }
  return found;
}

function search(enough: number, near: number): number {
  let bound = 0;
  for (let i = 0; i < 64; i++) {
    const square = vx * vx + vy * vy + vz * vz;
    if (square < 1e-14) return 0;
    support(-vx, -vy, -vz);
    const along = vx * wx + vy * wy + vz * wz;
    const length = Math.sqrt(square);
    if (along > bound * length) bound = along / length;
    if (bound > enough || (bound > near && bound >= CLOSE_ENOUGH * length)) return bound;
    if (square - along <= 1e-9 * square || known()) return length;
    simplex[3 * size] = wx; simplex[3 * size + 1] = wy; simplex[3 * size + 2] = wz;
    size++;
    if (nearestToOrigin()) return 0;
    if (vx * vx + vy * vy + vz * vz >= square) return length;
  }
  return bound;
}

function known(): boolean {
  for (let i = 0; i < 3 * size; i += 3) if (simplex[i] === wx && simplex[i + 1] === wy && simplex[i + 2] === wz) return true;
  return false;
}

/** Cuts the simplex down to the corners that carry its point nearest to the origin, and writes that point; true when the origin is inside. */
function nearestToOrigin(): boolean {
  let best = Infinity;
  let bestX = 0;
  let bestY = 0;
  let bestZ = 0;
  let keep = 0;
  // Every sub-simplex with the newest corner is tried: the nearest point of each affine hull that lies within it; the least of all is the answer.
  for (let mask = (1 << size) - 1; mask >= 1 << (size - 1); mask--) {
    if (!within(mask)) continue;
    const square = px * px + py * py + pz * pz;
    if (mask === 15) return true;
    if (square < best) {
      best = square;
      bestX = px; bestY = py; bestZ = pz;
      keep = mask;
    }
  }
  if (keep === 0) return false;
  vx = bestX; vy = bestY; vz = bestZ;
  let kept = 0;
  for (let i = 0; i < size; i++) {
    if (!((keep >> i) & 1)) continue;
    for (let k = 0; k < 3; k++) simplex[3 * kept + k] = simplex[3 * i + k] as number;
    kept++;
  }
  size = kept;
  return false;
}

let px = 0;
let py = 0;
let pz = 0;
const chosen = new Int32Array(4);

/** The point of the affine hull of the chosen corners that is nearest to the origin (px, py, pz): is it within them? */
function within(mask: number): boolean {
  let count = 0;
  for (let i = 0; i < size; i++) if ((mask >> i) & 1) chosen[count++] = 3 * i;
  const a = chosen[0] as number;
  const ax = simplex[a] as number;
  const ay = simplex[a + 1] as number;
  const az = simplex[a + 2] as number;
  if (count === 1) { px = ax; py = ay; pz = az; return true; }
  const b = chosen[1] as number;
  const ux = (simplex[b] as number) - ax;
  const uy = (simplex[b + 1] as number) - ay;
  const uz = (simplex[b + 2] as number) - az;
  const uu = ux * ux + uy * uy + uz * uz;
  const ua = -(ux * ax + uy * ay + uz * az);
  if (count === 2) {
    if (uu < 1e-20) return false;
    const s = ua / uu;
    if (s <= 0 || s >= 1) return false;
    px = ax + s * ux; py = ay + s * uy; pz = az + s * uz;
    return true;
  }
  const c = chosen[2] as number;
  const tx = (simplex[c] as number) - ax;
  const ty = (simplex[c + 1] as number) - ay;
  const tz = (simplex[c + 2] as number) - az;
  const tt = tx * tx + ty * ty + tz * tz;
  const ut = ux * tx + uy * ty + uz * tz;
  const ta = -(tx * ax + ty * ay + tz * az);
  if (count === 3) {
    const whole = uu * tt - ut * ut;
    if (whole < 1e-14 * uu * tt) return false;
    const s = (ua * tt - ta * ut) / whole;
    const r = (ta * uu - ua * ut) / whole;
    if (s <= 0 || r <= 0 || s + r >= 1) return false;
    px = ax + s * ux + r * tx; py = ay + s * uy + r * ty; pz = az + s * uz + r * tz;
    return true;
  }
  const d = chosen[3] as number;
  const qx = (simplex[d] as number) - ax;
  const qy = (simplex[d + 1] as number) - ay;
  const qz = (simplex[d + 2] as number) - az;
  const nx = ty * qz - tz * qy;
  const ny = tz * qx - tx * qz;
  const nz = tx * qy - ty * qx;
  const volume = ux * nx + uy * ny + uz * nz;
  if (Math.abs(volume) < 1e-12 * Math.sqrt(uu * tt * (qx * qx + qy * qy + qz * qz))) return false;
  const s = -(ax * nx + ay * ny + az * nz) / volume;
  const r = -(ux * (ay * qz - az * qy) + uy * (az * qx - ax * qz) + uz * (ax * qy - ay * qx)) / volume;
  const q = -(ux * (ty * az - tz * ay) + uy * (tz * ax - tx * az) + uz * (tx * ay - ty * ax)) / volume;
  px = 0; py = 0; pz = 0;
  return s > 0 && r > 0 && q > 0 && s + r + q < 1;
}
