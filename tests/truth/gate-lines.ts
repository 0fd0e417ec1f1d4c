import { gateHolds, type Gate } from '../../sample-data/truth/judge-curve.js';

/** Gates as lines that a failed test can print; `failed` holds those that do not hold. */
export function failedGateLines(gates: readonly Gate[]): string[] {
  return gates.filter((gate) => !gateHolds(gate))
    .map((gate) => `${gate.name}: ${gate.passed.toString()} of ${gate.of.toString()}, needed ${(gate.neededShare * 100).toString()} %`);
}
