import { NEWEST_EDITION, tablesOf, type ElementSymbol } from '@brimgate/reference-tables';
import type { AnsweredCheck, CheckedFunction } from '@brimgate/reference-tables/checks';
import { finishedHeadRetention } from '../src/excretion/finished-head';
import { balanceOf } from '../src/excretion/nutrient-balance';
import { sulfurIntakeKgPerDay, totalSulfurPctDm } from '../src/limits/total-sulfur';
import {
  crudeProteinEquivalentPct,
  elementShareOfCompound,
  nitrateFromNitrateNitrogenMgPerL,
  potassiumNitrateFromNitrate,
  sulfurFromSulfateMgPerL,
} from '../src/quantities/stoichiometry';
import { maintenanceEnergyMcalPerDay } from '../src/rations/growth';
import { netEnergyFromTdn } from '../src/rations/net-energy';
import { tableWaterLitresPerDay } from '../src/water/intake-table';

type Inputs = AnsweredCheck['inputs'];
type Answers = Readonly<Record<string, number | null>>;

const water = tablesOf(NEWEST_EDITION).waterIntake['nrc-winchester-morris-table'];

function figure(inputs: Inputs, name: string): number {
  const value = inputs[name];
  if (typeof value !== 'number') throw new Error(`The check gives no number ${name}`);
  return value;
}

function animalOf(inputs: Inputs) {
  return {
    entryWeightKg: figure(inputs, 'entryWeightKg'),
    exitWeightKg: figure(inputs, 'exitWeightKg'),
    daysOnFeed: figure(inputs, 'daysOnFeed'),
    standardReferenceWeightKg: figure(inputs, 'standardReferenceWeightKg'),
  };
}

/** How each function of the rules answers the inputs of a check, under the names the checks expect. */
export const answers: Readonly<Record<CheckedFunction, (inputs: Inputs) => Answers>> = {
  sulfurFromSulfateMgPerL: (inputs) => ({ sulfurMgPerL: sulfurFromSulfateMgPerL(figure(inputs, 'sulfateMgPerL')) }),
  totalSulfurPctDm: (inputs) => ({
    totalSulfurPctDm: totalSulfurPctDm({
      feedSulfurPctDm: figure(inputs, 'feedSulfurPctDm'),
      waterSulfurPctDm: figure(inputs, 'waterSulfurPctDm'),
    }),
  }),
  sulfurIntakeKgPerDay: (inputs) => ({
    sulfurIntakeKgPerDay: sulfurIntakeKgPerDay(
      figure(inputs, 'dryMatterIntakeKgPerDay'),
      figure(inputs, 'sulfurPctDm'),
    ),
  }),
  nitrateFromNitrateNitrogenMgPerL: (inputs) => ({
    nitrateMgPerL: nitrateFromNitrateNitrogenMgPerL(figure(inputs, 'nitrateNitrogenMgPerL')),
  }),
  potassiumNitrateFromNitrate: (inputs) => ({
    potassiumNitrateMgPerKg: potassiumNitrateFromNitrate(figure(inputs, 'nitrateMgPerKg')),
  }),
  waterIntakeLitresPerDay: (inputs) => {
    const waterClass = water.classes.find(({ id }) => id === inputs.cattleClass);
    if (!waterClass) throw new Error('The check names no class of the water table');
    const at = { bodyWeightKg: figure(inputs, 'bodyWeightKg'), temperatureC: figure(inputs, 'temperatureC') };
    return { litresPerDay: tableWaterLitresPerDay(water, waterClass.id, at).litresPerDay };
  },
  netEnergyFromTdn: (inputs) => {
    const energy = netEnergyFromTdn(figure(inputs, 'tdnPct'));
    return {
      netEnergyMaintenanceMcalPerKg: energy.maintenanceMcalPerKgDm,
      netEnergyGainMcalPerKg: energy.gainMcalPerKgDm,
    };
  },
  maintenanceEnergyMcalPerDay: (inputs) => ({
    maintenanceMcalPerDay: maintenanceEnergyMcalPerDay(figure(inputs, 'bodyWeightKg')),
  }),
  crudeProteinEquivalentPct: (inputs) => ({
    crudeProteinEquivalentPct: crudeProteinEquivalentPct(figure(inputs, 'nitrogenPct')),
  }),
  finishedHeadRetention: (inputs) => ({ ...finishedHeadRetention(animalOf(inputs)) }),
  finishedHeadExcretion: (inputs) => {
    const { nitrogenRetainedKg, phosphorusRetainedKg } = finishedHeadRetention(animalOf(inputs));
    return {
      nitrogenExcretedKg: balanceOf(figure(inputs, 'nitrogenIntakeKg'), nitrogenRetainedKg).excretedKg,
      phosphorusExcretedKg: balanceOf(figure(inputs, 'phosphorusIntakeKg'), phosphorusRetainedKg).excretedKg,
    };
  },
  elementShareOfCompound: ({ element, atoms }) => {
    if (typeof element !== 'string' || typeof atoms !== 'object') throw new Error('The check names no compound');
    return { sharePct: 100 * elementShareOfCompound(element as ElementSymbol, atoms) };
  },
};
