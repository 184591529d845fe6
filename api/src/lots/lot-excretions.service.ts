import { NEWEST_EDITION } from '@brimgate/reference-tables';
import { lotExcretion, type LotExcretion, type LotInput, RULES_VERSION, type ScreeningRequest } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import type { ReleaseModel } from '../releases/release.model';
import { ScreeningRequestModel } from '../screenings/screening-request.model';
import { ScreeningModel } from '../screenings/screening.model';
import { daysBetween } from './days-between';

type Lot = { input: LotInput; release: ReleaseModel | null };

export type ComputedExcretion = {
  excretion: LotExcretion;
  isDetermined: boolean;
  rulesVersion: string;
  edition: string;
};

/** What a lot excreted, from the stored screening of the release it was fed. */
@Injectable()
export class LotExcretions {
  async of({ input, release }: Lot, transaction: Transaction): Promise<ComputedExcretion> {
    const fed = release && (await this.screeningOf(release, transaction));
    const edition = fed?.edition ?? NEWEST_EDITION;
    const standardReferenceWeightKg = fed?.request.request.cattle.standardReferenceWeightKg;
    const facts = {
      head: input.head,
      daysOnFeed: input.endedOn === null ? null : daysBetween(input.startedOn, input.endedOn),
      entryWeightKg: input.entryWeightKg,
      exitWeightKg: input.exitWeightKg,
      weightBasis: input.weightBasis,
      dryMatterIntakeKgPerDay: input.dryMatterIntakeKgPerDay,
      rationFed: fed && rationFed(fed),
      ...(standardReferenceWeightKg !== undefined && { standardReferenceWeightKg }),
    };
    const excretion = lotExcretion(facts, edition);
    const { nitrogen, phosphorus } = excretion.wholeLot;
    const isDetermined = nitrogen.excretedKg !== null && phosphorus.excretedKg !== null;
    return { excretion, isDetermined, rulesVersion: RULES_VERSION, edition };
  }

  private async screeningOf({ firmId, screeningId }: ReleaseModel, transaction: Transaction): Promise<ScreeningModel> {
    const screening = await ScreeningModel.findOne({
      where: { firmId, id: screeningId },
      include: [ScreeningRequestModel],
      transaction,
    });
    if (!screening) throw new Error(`Screening ${screeningId} is not there`);
    return screening;
  }
}

function rationFed({ screening, request }: ScreeningModel) {
  const { crudeProteinPctDm, phosphorusPctDm } = screening.totals;
  return { crudeProteinPctDm, phosphorusPctDm, potassiumPctDm: potassiumPctDm(request.request) };
}

/** Potassium of the lines by their shares; not determined as soon as one line's is not. [% of DM] */
function potassiumPctDm({ lines }: ScreeningRequest): number | null {
  return lines.reduce<number | null>((sum, { sharePctDm, composition }) => {
    if (sharePctDm === 0) return sum;
    if (sum === null || composition.potassiumPctDm === undefined) return null;
    return sum + (sharePctDm / 100) * composition.potassiumPctDm;
  }, 0);
}
