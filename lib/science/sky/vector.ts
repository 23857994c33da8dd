/** A direction or position in three dimensions. */
export type Vector3 = readonly [number, number, number]

export function dot(a: Vector3, b: Vector3): number {
  return a[0] * b[0] + a[1] * b[1] + a[2] * b[2]
}

export function length(a: Vector3): number {
  return Math.hypot(a[0], a[1], a[2])
}

export function subtract(a: Vector3, b: Vector3): Vector3 {
  return [a[0] - b[0], a[1] - b[1], a[2] - b[2]]
}

/** Angle between two vectors, degrees; exact for small angles too. */
export function angleDeg(a: Vector3, b: Vector3): number {
  const x = a[1] * b[2] - a[2] * b[1]
  const y = a[2] * b[0] - a[0] * b[2]
  const z = a[0] * b[1] - a[1] * b[0]
  return (Math.atan2(Math.hypot(x, y, z), dot(a, b)) * 180) / Math.PI
}

/** Unit vector of a longitude-like and a latitude-like angle, radians. */
export function direction(longitude: number, latitude: number): Vector3 {
  const c = Math.cos(latitude)
  return [c * Math.cos(longitude), c * Math.sin(longitude), Math.sin(latitude)]
}
