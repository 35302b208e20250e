/* Fixed point of "activity coefficients from molalities from activity coefficients", sped up by its own past. */

const depth = 4
const ridge = 1e-13
/** A residual that grows by more than this starts the past anew, with shorter plain steps. */
const greatestGrowth = 2
const leastShare = 1 / 64

/**
 * Anderson acceleration: the next point is the model's answer, corrected by the combination of the last few
 * steps that would have made the last residual least. Arrays are made once; `begin` starts anew.
 */
export class FixedPoint {
  private readonly size: number
  private readonly residual: Float64Array
  private readonly image: Float64Array
  private readonly residualSteps: readonly Float64Array[]
  private readonly imageSteps: readonly Float64Array[]
  private readonly normal = new Float64Array(depth * depth)
  private readonly right = new Float64Array(depth)
  private held = 0
  private hasPast = false
  private share = 1
  private before = Infinity

  constructor(size: number) {
    const make = () => new Float64Array(size)
    this.size = size
    this.residual = make()
    this.image = make()
    this.residualSteps = Array.from({ length: depth }, make)
    this.imageSteps = Array.from({ length: depth }, make)
  }

  begin(): void {
    this.held = 0
    this.hasPast = false
    this.share = 1
    this.before = Infinity
  }

  /**
   * Moves `point` on, given the model's answer `image` at it. Returns the largest residual before the move,
   * or Infinity when the answer is not finite.
   */
  advance(point: Float64Array, image: Float64Array): number {
    let largest = 0
    for (let i = 0; i < this.size; i++) {
      const residual = (image[i] as number) - (point[i] as number)
      if (!Number.isFinite(residual)) return Infinity
      if (Math.abs(residual) > largest) largest = Math.abs(residual)
    }
    if (largest > greatestGrowth * this.before) {
      this.held = 0
      this.hasPast = false
      this.share = Math.max(this.share / 2, leastShare)
    } else this.remember(point, image)
    this.before = largest
    this.store(point, image)
    const used = this.held
    if (used > 0 && this.solve(used)) this.combine(point, image, used)
    else {
      for (let i = 0; i < this.size; i++) {
        point[i] = (point[i] as number) + this.share * ((image[i] as number) - (point[i] as number))
      }
    }
    return largest
  }

  /** Keeps the difference to the last point: the newest in the place of the oldest. */
  private remember(point: Float64Array, image: Float64Array): void {
    if (!this.hasPast) return
    const place = this.held < depth ? this.held : depth - 1
    if (this.held === depth) this.forgetOldest()
    const residualStep = this.residualSteps[place] as Float64Array
    const imageStep = this.imageSteps[place] as Float64Array
    for (let i = 0; i < this.size; i++) {
      const residual = (image[i] as number) - (point[i] as number)
      residualStep[i] = residual - (this.residual[i] as number)
      imageStep[i] = (image[i] as number) - (this.image[i] as number)
    }
    this.held = place + 1
  }

  private forgetOldest(): void {
    for (let k = 1; k < depth; k++) {
      ;(this.residualSteps[k - 1] as Float64Array).set(this.residualSteps[k] as Float64Array)
      ;(this.imageSteps[k - 1] as Float64Array).set(this.imageSteps[k] as Float64Array)
    }
  }

  private store(point: Float64Array, image: Float64Array): void {
    for (let i = 0; i < this.size; i++) this.residual[i] = (image[i] as number) - (point[i] as number)
    this.image.set(image)
    this.hasPast = true
  }

  /** Weights of the remembered steps, by least squares on the residual. */
  private solve(used: number): boolean {
    const { normal, right } = this
    for (let row = 0; row < used; row++) {
      const one = this.residualSteps[row] as Float64Array
      for (let column = 0; column <= row; column++) {
        normal[row * depth + column] = dot(one, this.residualSteps[column] as Float64Array)
      }
      normal[row * depth + row] = (normal[row * depth + row] as number) * (1 + ridge)
      right[row] = dot(one, this.residual)
    }
    for (let row = 0; row < used; row++) {
      for (let column = 0; column <= row; column++) {
        let value = normal[row * depth + column] as number
        for (let k = 0; k < column; k++) {
          value -= (normal[row * depth + k] as number) * (normal[column * depth + k] as number)
        }
        if (row !== column) normal[row * depth + column] = value / (normal[column * depth + column] as number)
        else if (value > 0) normal[row * depth + row] = Math.sqrt(value)
        else return false
      }
    }
    for (let row = 0; row < used; row++) {
      let value = right[row] as number
      for (let k = 0; k < row; k++) value -= (normal[row * depth + k] as number) * (right[k] as number)
      right[row] = value / (normal[row * depth + row] as number)
    }
    for (let row = used - 1; row >= 0; row--) {
      let value = right[row] as number
      for (let k = row + 1; k < used; k++) value -= (normal[k * depth + row] as number) * (right[k] as number)
      right[row] = value / (normal[row * depth + row] as number)
    }
    return Number.isFinite(right[0])
  }

  private combine(point: Float64Array, image: Float64Array, used: number): void {
    point.set(image)
    for (let k = 0; k < used; k++) {
      const weight = this.right[k] as number
      const step = this.imageSteps[k] as Float64Array
      for (let i = 0; i < this.size; i++) point[i] = (point[i] as number) - weight * (step[i] as number)
    }
  }
}

function dot(one: Float64Array, two: Float64Array): number {
  let sum = 0
  for (let i = 0; i < one.length; i++) sum += (one[i] as number) * (two[i] as number)
  return sum
}
