import { Controller, Get, Query } from '@nestjs/common';
import { ApiOkResponse, ApiOperation, ApiTags, ApiUnprocessableEntityResponse } from '@nestjs/swagger';
import { markingsFor } from '@resistry/engineering/marking/markings-for';
import { readMarking } from '@resistry/engineering/marking/read-marking';
import { parseQuantity } from '@resistry/engineering/notation/parse-quantity';
import { valuesBetween } from '@resistry/engineering/preferred-values/values-between';
import { ClashProblem, MalformedProblem } from '../common/problems/problems';
import { ProblemDocument } from '../common/problems/problem-document';
import { May } from '../permissions/may.decorator';
import {
  MarkingDto,
  MarkingQuery,
  NotationDto,
  NotationQuery,
  PreferredValuesDto,
  PreferredValuesQuery,
} from './dto/notation.dto';

@ApiTags('notation')
@Controller()
export class NotationController {
  @Get('notation')
  @May('compute', 'Search')
  @ApiOperation({
    operationId: 'readNotation',
    summary: 'A quantity as engineers write it, read into its SI value',
  })
  @ApiOkResponse({ type: NotationDto })
  @ApiUnprocessableEntityResponse({ type: ProblemDocument })
  notation(@Query() query: NotationQuery): NotationDto {
    const parsed = parseQuantity(query.text, query.quantity);
    if (!parsed.ok) throw new ClashProblem(parsed.message, [{ pointer: '/text', message: parsed.message }]);
    return { value: parsed.value, text: parsed.text, tolerance: parsed.tolerance };
  }

  @Get('preferred-values')
  @May('compute', 'Search')
  @ApiOperation({
    operationId: 'listPreferredValues',
    summary: 'Preferred values of a series between two resistances (IEC 60063)',
  })
  @ApiOkResponse({ type: PreferredValuesDto })
  @ApiUnprocessableEntityResponse({ type: ProblemDocument })
  preferredValues(@Query() query: PreferredValuesQuery): PreferredValuesDto {
    try {
      return { values: valuesBetween(query.from, query.to, query.series) };
    } catch (error) {
      if (!(error instanceof RangeError)) throw error;
      throw new ClashProblem(error.message, [
        { pointer: '/from', message: error.message },
        { pointer: '/to', message: error.message },
      ]);
    }
  }

  @Get('marking')
  @May('compute', 'Search')
  @ApiOperation({
    operationId: 'readMarking',
    summary: 'What a marking can mean, or the forms a resistance can bear (IEC 60062)',
  })
  @ApiOkResponse({ type: MarkingDto })
  @ApiUnprocessableEntityResponse({ type: ProblemDocument })
  marking(@Query() query: MarkingQuery): MarkingDto {
    const { text, resistance, tolerance, tcr } = query;
    if ((text === undefined) === (resistance === undefined)) {
      throw new MalformedProblem([
        { pointer: '/text', message: 'state either a text to read or a resistance to mark' },
        { pointer: '/resistance', message: 'state either a text to read or a resistance to mark' },
      ]);
    }
    if (text !== undefined) {
      const read = readMarking(text);
      if (!read.ok) throw new ClashProblem(read.message, [{ pointer: '/text', message: read.message }]);
      return { readings: [...read.readings] };
    }
    const marked = markingsFor({ resistance: resistance ?? NaN, tolerance, tcr });
    if (!marked.ok)
      throw new ClashProblem(marked.message, [{ pointer: '/resistance', message: marked.message }]);
    return { forms: marked.forms.map((form) => ({ ...form })) };
  }
}
