/** Why a water-intake model gives no figure; turned into a not-determined intake that says this reason. */
export class WaterIntakeOutOfRange extends Error {
  override readonly name = 'WaterIntakeOutOfRange';

  constructor(
    readonly path: string,
    reason: string,
  ) {
    super(reason);
  }
}
