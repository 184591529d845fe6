import { randomUUID } from 'node:crypto';
import type { INestApplicationContext } from '@nestjs/common';
import type { FeedstuffInput } from '@brimgate/rules';
import type { CurrentUser } from '../../common/current-user';
import { FeedstuffsService } from '../../feedstuffs/feedstuffs.service';
import { WaterService } from '../../water/water.service';
import { YardsService } from '../../yards/yards.service';
import { daysAgo, happening } from './demo-clock';
import type { DemoAnalysis, demoWaters } from './demo-facts';

const LABORATORY_DAYS = 3;

export async function seedFeedstuffs(
  app: INestApplicationContext,
  user: CurrentUser,
  inputs: readonly FeedstuffInput[],
): Promise<void> {
  const feedstuffs = app.get(FeedstuffsService, { strict: false });
  const known = new Set((await feedstuffs.list(user)).items.map(({ name }) => name));
  for (const input of inputs.filter(({ name }) => !known.has(name))) {
    await happening(190, () => feedstuffs.create(input, user));
  }
}

export async function seedWaters(
  app: INestApplicationContext,
  user: CurrentUser,
  waters: typeof demoWaters,
): Promise<void> {
  const service = app.get(WaterService, { strict: false });
  const yards = (await app.get(YardsService, { strict: false }).list(user)).items;
  for (const { yard, name, analyses } of waters) {
    const known = (await service.list(undefined, user)).items.find((source) => source.name === name);
    const yardId = yards.find((own) => own.name === yard)?.id ?? '';
    const source = known ?? (await happening(199, () => service.create({ yardId, name }, user)));
    for (const analysis of analyses.slice(source.analyses.length)) await enter(service, source.id, analysis, user);
  }
}

async function enter(
  service: WaterService,
  sourceUuid: string,
  { sampledDaysAgo, ...figures }: DemoAnalysis,
  user: CurrentUser,
): Promise<void> {
  const input = { ...figures, sampledOn: daysAgo(sampledDaysAgo) };
  await happening(sampledDaysAgo - LABORATORY_DAYS, () =>
    service.addAnalysis({ sourceUuid, input, key: randomUUID() }, user),
  );
}
