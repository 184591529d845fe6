import type { INestApplicationContext } from '@nestjs/common';
import type { LotInput } from '@brimgate/rules';
import type { CurrentUser } from '../../common/current-user';
import { LotModel } from '../../lots/lot.model';
import { LotsService } from '../../lots/lots.service';
import { daysAgo, happening } from './demo-clock';

type DemoLot = Omit<LotInput, 'yardId' | 'releaseId' | 'startedOn' | 'endedOn'> & {
  startedDaysAgo: number;
  endedDaysAgo: number | null;
};

/** Two lots that went out and one that is still on feed. */
const demoLots: readonly DemoLot[] = [
  {
    name: 'Lot 114',
    head: 182,
    startedDaysAgo: 184,
    endedDaysAgo: 19,
    entryWeightKg: 352,
    exitWeightKg: 618,
    weightBasis: 'shrunk',
    dryMatterIntakeKgPerDay: 10.3,
  },
  {
    name: 'Lot 115',
    head: 204,
    startedDaysAgo: 172,
    endedDaysAgo: 8,
    entryWeightKg: 361,
    exitWeightKg: 622,
    weightBasis: 'shrunk',
    dryMatterIntakeKgPerDay: 10.6,
  },
  {
    name: 'Lot 118',
    head: 197,
    startedDaysAgo: 47,
    endedDaysAgo: null,
    entryWeightKg: 348,
    exitWeightKg: null,
    weightBasis: 'shrunk',
    dryMatterIntakeKgPerDay: 9.8,
  },
];

export async function seedLots(
  app: INestApplicationContext,
  user: CurrentUser,
  fed: { yardId: string; releaseId: string | null },
): Promise<void> {
  const known = await LotModel.findAll({ where: { firmId: user.firmId }, attributes: ['name'] });
  const names = new Set(known.map(({ name }) => name));
  for (const { startedDaysAgo, endedDaysAgo, ...lot } of demoLots.filter(({ name }) => !names.has(name))) {
    const input: LotInput = {
      ...lot,
      ...fed,
      startedOn: daysAgo(startedDaysAgo),
      endedOn: endedDaysAgo === null ? null : daysAgo(endedDaysAgo),
    };
    await happening(endedDaysAgo ?? startedDaysAgo, () =>
      app.get(LotsService, { strict: false }).create({ input, user }),
    );
  }
}
