import { Controller, Get, Query } from '@nestjs/common';
import { ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { May } from '../permissions/may.decorator';
import { ReviewList, ReviewQuery } from './review.dto';
import { ReviewsService } from './reviews.service';

@ApiTags('reviews')
@Controller('reviews')
export class ReviewsController {
  constructor(private readonly reviews: ReviewsService) {}

  @Get()
  @May('read', 'Review')
  @ApiOperation({ operationId: 'listReviews', summary: 'Parts that wait for a decision, or got one' })
  @ApiOkResponse({ type: ReviewList })
  async list(@Query() query: ReviewQuery): Promise<ReviewList> {
    return this.reviews.list(query);
  }
}
