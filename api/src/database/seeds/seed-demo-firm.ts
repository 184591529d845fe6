import type { INestApplicationContext } from '@nestjs/common';
import { benchWell, demoFeedstuffs, demoWaters } from './demo-facts';
import { benchFinisher, finisher1, finisher4, grower2, grower3 } from './demo-rations';
import { demoUser } from './demo-user';
import { seedFeedstuffs, seedWaters } from './seed-facts';
import { seedFirms } from './seed-firms';
import { seedLots } from './seed-lots';
import { RationSeed } from './seed-rations';

const GREASEWOOD = 'Greasewood Ration Works';
const SALTGRASS = 'Saltgrass Feeding Group';

const WHY_FINISHER_4 =
  'The South well is down for repair until the middle of the month, so pens 3 to 6 drink from the North well. ' +
  'Sulfur from feed alone stays below the limit; we would watch these pens daily and go back to the South well at once.';

/** The demo: made through the services, so that what it shows was screened, hashed and audited like anything else. */
export async function seedDemoFirm(app: INestApplicationContext, password: string): Promise<void> {
  await seedFirms(app, password);
  await seedGreasewood(app);
  await seedSaltgrass(app);
}

async function seedGreasewood(app: INestApplicationContext): Promise<void> {
  const nora = await demoUser(GREASEWOOD, 'nora@greasewood.example');
  const jonah = await demoUser(GREASEWOOD, 'jonah@greasewood.example');
  await seedFeedstuffs(app, nora, demoFeedstuffs());
  await seedWaters(app, nora, demoWaters);
  const rations = new RationSeed(app, nora);
  const fed = await rations.released(finisher1, 186);
  await seedLots(app, jonah, { yardId: fed.yard.id, releaseId: fed.releaseId });
  await rations.screened(grower2, 4);
  await rations.screened(grower3, 3);
  await rations.submitted(finisher4, WHY_FINISHER_4, 1);
}

async function seedSaltgrass(app: INestApplicationContext): Promise<void> {
  const petra = await demoUser(SALTGRASS, 'petra@saltgrass.example');
  await seedWaters(app, petra, [benchWell]);
  await new RationSeed(app, petra).drafted(benchFinisher, 2);
}
