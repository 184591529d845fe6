import { DecisionInput, type RationView, ReviewInput, type ReviewListItem, type ReviewView } from '@brimgate/rules';
import { Body, Controller, Get, HttpCode, Param, Post, Query } from '@nestjs/common';
import { Allow } from '../common/allow.decorator';
import { CurrentUser } from '../common/current-user';
import { IdempotencyKey } from '../common/idempotency-key.decorator';
import { IfMatch } from '../common/if-match.decorator';
import type { Page } from '../common/keyset';
import { valid } from '../common/valid.pipe';
import { DecisionsService } from './decisions.service';
import { ReviewDesk, ReviewListQuery } from './review-desk.service';
import { SubmissionsService } from './submissions.service';

@Controller()
export class ReviewsController {
  constructor(
    private readonly desk: ReviewDesk,
    private readonly submissions: SubmissionsService,
    private readonly decisions: DecisionsService,
  ) {}

  @Get('reviews')
  @Allow('read-rations')
  findPage(
    @Query(valid(ReviewListQuery)) query: ReviewListQuery,
    @CurrentUser() user: CurrentUser,
  ): Promise<Page<ReviewListItem>> {
    return this.desk.page({ user, query });
  }

  @Get('reviews/:reviewId')
  @Allow('read-rations')
  findOne(@Param('reviewId') reviewId: string, @CurrentUser() user: CurrentUser): Promise<ReviewView> {
    return this.desk.view({ user, reviewId });
  }

  /** Sends the screened version to the review desk with the nutritionist's reason. */
  @Post('rations/:rationId/reviews')
  @Allow('submit-rations')
  submit(
    @Param('rationId') rationId: string,
    @Body(valid(ReviewInput)) input: ReviewInput,
    @IfMatch() version: number,
    @IdempotencyKey() key: string,
    @CurrentUser() user: CurrentUser,
  ): Promise<RationView> {
    return this.submissions.submit({ rationId, input, version, key, user });
  }

  /** Takes it back while nobody has decided. */
  @Post('reviews/:reviewId/withdrawal')
  @HttpCode(200)
  @Allow('submit-rations')
  withdraw(
    @Param('reviewId') reviewId: string,
    @IdempotencyKey() key: string,
    @CurrentUser() user: CurrentUser,
  ): Promise<RationView> {
    return this.submissions.withdraw({ reviewId, key, user });
  }

  /** Signs: the password is asked again, and the decision is bound to the content that was shown. */
  @Post('reviews/:reviewId/decisions')
  @Allow('sign-as-veterinarian', 'sign-as-compliance')
  decide(
    @Param('reviewId') reviewId: string,
    @Body(valid(DecisionInput)) input: DecisionInput,
    @IdempotencyKey() key: string,
    @CurrentUser() user: CurrentUser,
  ): Promise<ReviewView> {
    return this.decisions.decide({ reviewId, input, key, user });
  }
}
