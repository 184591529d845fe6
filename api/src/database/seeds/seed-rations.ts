import { randomUUID } from 'node:crypto';
import type { INestApplicationContext, Type } from '@nestjs/common';
import type { RationContent, RationView } from '@brimgate/rules';
import type { CurrentUser } from '../../common/current-user';
import { FeedstuffsService } from '../../feedstuffs/feedstuffs.service';
import { RationModel } from '../../rations/ration.model';
import { RationViews } from '../../rations/ration-views.service';
import { RationsService } from '../../rations/rations.service';
import { ReleasesService } from '../../releases/releases.service';
import { SubmissionsService } from '../../reviews/submissions.service';
import { ScreeningsService } from '../../screenings/screenings.service';
import { WaterService } from '../../water/water.service';
import { YardsService } from '../../yards/yards.service';
import { happening } from './demo-clock';
import type { DemoRation } from './demo-rations';

/** Takes rations as far as the story has them, from wherever an earlier start was cut off. */
export class RationSeed {
  constructor(
    private readonly app: INestApplicationContext,
    private readonly user: CurrentUser,
  ) {}

  /** The ration as somebody began to write it. */
  async drafted(demo: DemoRation, days: number): Promise<RationView> {
    const known = await RationModel.findOne({ where: { firmId: this.user.firmId, name: demo.name } });
    if (known) return this.service(RationViews).view({ user: this.user, rationId: known.uuid });
    const yards = (await this.service(YardsService).list(this.user)).items;
    const yardId = yards.find(({ name }) => name === demo.yard)?.id ?? '';
    const draft = await this.contentOf(demo);
    return happening(days, () =>
      this.service(RationsService).create({ input: { yardId, name: demo.name, draft }, user: this.user }),
    );
  }

  async screened(demo: DemoRation, days: number): Promise<RationView> {
    const ration = await this.drafted(demo, days);
    if (ration.state !== 'draft') return ration;
    const { id: rationId, version } = ration;
    const content = await this.contentOf(demo);
    return happening(days, () =>
      this.service(ScreeningsService).create({ rationId, content, version, user: this.user }),
    );
  }

  async submitted(demo: DemoRation, reason: string, days: number): Promise<RationView> {
    const ration = await this.screened(demo, days);
    if (ration.state !== 'screened') return ration;
    const { id: rationId, version } = ration;
    const input = { screeningId: ration.screening?.id ?? '', reason };
    return happening(days, () =>
      this.service(SubmissionsService).submit({ rationId, input, version, key: randomUUID(), user: this.user }),
    );
  }

  async released(demo: DemoRation, days: number): Promise<RationView> {
    const ration = await this.screened(demo, days);
    if (ration.state !== 'screened') return ration;
    const { id: rationId, version } = ration;
    const input = { screeningId: ration.screening?.id ?? '', reason: null };
    return happening(days, () =>
      this.service(ReleasesService).release({ rationId, input, version, key: randomUUID(), user: this.user }),
    );
  }

  private async contentOf({ cattle, lines, water, waterIntake }: DemoRation): Promise<RationContent> {
    const feedstuffs = (await this.service(FeedstuffsService).list(this.user)).items;
    const waters = (await this.service(WaterService).list(undefined, this.user)).items;
    const analysis = waters.find(({ name }) => name === water)?.analyses[0];
    return {
      cattle,
      lines: lines.map(([feedstuff, sharePctDm]) => ({
        feedstuffId: feedstuffs.find(({ id, name }) => id === feedstuff || name === feedstuff)?.id ?? feedstuff,
        sharePctDm,
      })),
      waters: analysis ? [{ waterAnalysisId: analysis.id, sharePct: 100 }] : [],
      waterIntake,
    };
  }

  private service<Service>(type: Type<Service>): Service {
    return this.app.get(type, { strict: false });
  }
}
