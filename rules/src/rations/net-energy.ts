import { NEWEST_EDITION, tablesOf, type ReferenceTables } from '@brimgate/reference-tables';
import type { RationLineInput } from '../screenings/screening-request.schema';

export interface NetEnergy {
  readonly maintenanceMcalPerKgDm: number;
  readonly gainMcalPerKgDm: number;
}

/**
 * Net energy for maintenance and for gain of a feed, from its total digestible nutrients. [Mcal/kg DM]
 *
 * Digestible energy from TDN, metabolizable as a fixed share of it, then a cubic in metabolizable energy for each. Holds
 * for feeds as tabulated; high-concentrate diets hold more metabolizable energy. Coefficients and source: constants/energy.
 */
export function netEnergyFromTdn(tdnPctDm: number, tables: ReferenceTables = tablesOf(NEWEST_EDITION)): NetEnergy {
  const c = tables.constants.energy.constants;
  const digestible = (c.digestibleEnergyMcalPerKgTdn.value * tdnPctDm) / 100;
  const me = c.metabolizablePerDigestibleEnergy.value * digestible;
  const cubic = (linear: number, square: number, cube: number, intercept: number) =>
    linear * me + square * me ** 2 + cube * me ** 3 + intercept;
  return {
    maintenanceMcalPerKgDm: cubic(
      c.maintenanceLinear.value,
      c.maintenanceSquare.value,
      c.maintenanceCube.value,
      c.maintenanceIntercept.value,
    ),
    gainMcalPerKgDm: cubic(c.gainLinear.value, c.gainSquare.value, c.gainCube.value, c.gainIntercept.value),
  };
}

/** Lines with net energy filled in from TDN where only TDN is given, and what to say about it. */
export function withNetEnergy(lines: readonly RationLineInput[], tables: ReferenceTables) {
  const filled: string[] = [];
  const complete = lines.map((line) => {
    const { tdnPctDm, netEnergyMaintenanceMcalPerKgDm, netEnergyGainMcalPerKgDm } = line.composition;
    const isComplete = netEnergyMaintenanceMcalPerKgDm !== undefined && netEnergyGainMcalPerKgDm !== undefined;
    if (isComplete || tdnPctDm === undefined || line.sharePctDm === 0) return line;
    filled.push(line.feedstuff);
    const energy = netEnergyFromTdn(tdnPctDm, tables);
    const composition = {
      ...line.composition,
      netEnergyMaintenanceMcalPerKgDm: netEnergyMaintenanceMcalPerKgDm ?? energy.maintenanceMcalPerKgDm,
      netEnergyGainMcalPerKgDm: netEnergyGainMcalPerKgDm ?? energy.gainMcalPerKgDm,
    };
    return { ...line, composition };
  });
  const said = `Net energy was reckoned from TDN for ${filled.join(', ')}.`;
  return { lines: complete, assumptions: filled.length > 0 ? [said] : [] };
}
