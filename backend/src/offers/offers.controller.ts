import { Body, Controller, HttpCode, Param, Post, Put } from '@nestjs/common';
import {
  ApiConflictResponse,
  ApiCreatedResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
  ApiUnprocessableEntityResponse,
} from '@nestjs/swagger';
import { ProblemDocument } from '../common/problems/problem-document';
import { IdentifierPipe } from '../common/validation/identifier.pipe';
import { CurrentPerson } from '../permissions/current-person.decorator';
import { May } from '../permissions/may.decorator';
import { Person } from '../permissions/person';
import { NewOfferForm, OfferChangeForm, OfferEndForm } from './dto/offer-forms.dto';
import { OfferDto } from './dto/offer.dto';
import { OfferChanges } from './offer-changes';
import { OfferReading } from './offer-reading';

@ApiTags('offers')
@Controller('offers')
export class OffersController {
  constructor(
    private readonly changes: OfferChanges,
    private readonly reading: OfferReading,
  ) {}

  @Post()
  @May('create', 'Offer')
  @ApiOperation({ operationId: 'enterOffer', summary: 'Enter what a supplier offers for a part' })
  @ApiCreatedResponse({ type: OfferDto })
  @ApiNotFoundResponse({ type: ProblemDocument })
  @ApiUnprocessableEntityResponse({ type: ProblemDocument })
  async enter(@Body() body: NewOfferForm, @CurrentPerson() person: Person): Promise<OfferDto> {
    const { partId, ...terms } = body;
    return this.reading.find(await this.changes.enter(person, partId, terms));
  }

  @Put(':id')
  @May('update', 'Offer')
  @ApiOperation({ operationId: 'changeOffer', summary: 'Change the terms of an offer' })
  @ApiOkResponse({ type: OfferDto })
  @ApiNotFoundResponse({ type: ProblemDocument })
  @ApiConflictResponse({ type: ProblemDocument })
  @ApiUnprocessableEntityResponse({ type: ProblemDocument })
  async change(
    @Param('id', IdentifierPipe) id: number,
    @Body() body: OfferChangeForm,
    @CurrentPerson() person: Person,
  ): Promise<OfferDto> {
    const { version, ...terms } = body;
    await this.changes.change(person, id, version, terms);
    return this.reading.find(id);
  }

  @Post(':id/end')
  @May('end', 'Offer')
  @HttpCode(200)
  @ApiOperation({ operationId: 'endOffer', summary: 'End an offer; it stays on record' })
  @ApiOkResponse({ type: OfferDto })
  @ApiNotFoundResponse({ type: ProblemDocument })
  @ApiConflictResponse({ type: ProblemDocument })
  @ApiUnprocessableEntityResponse({ type: ProblemDocument })
  async end(
    @Param('id', IdentifierPipe) id: number,
    @Body() body: OfferEndForm,
    @CurrentPerson() person: Person,
  ): Promise<OfferDto> {
    await this.changes.end(person, id, body.version, body.reason);
    return this.reading.find(id);
  }
}
