import { Controller, Get, Param, Query } from '@nestjs/common';
import { ApiNotFoundResponse, ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { ProblemDocument } from '../common/problems/problem-document';
import { May } from '../permissions/may.decorator';
import { CompanyPartNumbersService } from './company-part-numbers.service';
import {
  CompanyPartNumberDto,
  CompanyPartNumberList,
  CompanyPartNumberQuery,
} from './dto/company-part-number.dto';

@ApiTags('company-part-numbers')
@Controller('company-part-numbers')
export class CompanyPartNumbersController {
  constructor(private readonly numbers: CompanyPartNumbersService) {}

  @Get()
  @May('read', 'CompanyPartNumber')
  @ApiOperation({ operationId: 'listCompanyPartNumbers', summary: 'Company part numbers, by number' })
  @ApiOkResponse({ type: CompanyPartNumberList })
  async list(@Query() query: CompanyPartNumberQuery): Promise<CompanyPartNumberList> {
    return this.numbers.list(query);
  }

  @Get(':number')
  @May('read', 'CompanyPartNumber')
  @ApiOperation({
    operationId: 'readCompanyPartNumber',
    summary: 'A company part number with its approved manufacturer list',
  })
  @ApiOkResponse({ type: CompanyPartNumberDto })
  @ApiNotFoundResponse({ type: ProblemDocument })
  async read(@Param('number') number: string): Promise<CompanyPartNumberDto> {
    return this.numbers.find(number);
  }
}
