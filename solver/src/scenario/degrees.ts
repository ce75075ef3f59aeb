/** sin of an angle in degrees; exact at multiples of 90, where π is not. */
export function sinDegrees(angle: number): number {
  return angle % 90 === 0 ? [0, 1, 0, -1][quarterOf(angle)] : Math.sin((angle * Math.PI) / 180);
}

/** cos of an angle in degrees; exact at multiples of 90. */
export function cosDegrees(angle: number): number {
  return angle % 90 === 0 ? [1, 0, -1, 0][quarterOf(angle)] : Math.cos((angle * Math.PI) / 180);
}

/** 0…3. */
const quarterOf = (angle: number) => (((angle / 90) % 4) + 4) % 4;
