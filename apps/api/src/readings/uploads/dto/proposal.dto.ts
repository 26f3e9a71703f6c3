import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { MappingInput } from '../../../towers/dto/mapping.dto';
import type { Question } from '../../parse/propose/questions';

/** One answer to a question. */
@ApiSchema({ name: 'Choice' })
export class ChoiceDto {
  @ApiProperty() value!: string;
  @ApiProperty() text!: string;
}

const questionIds = [
  'repeated-hour',
  'missing-hour',
  'day-or-month-first',
  'unit',
  'rows-off-the-step',
] as const satisfies readonly Question['id'][];

/** Something about a file that only a person can say. */
@ApiSchema({ name: 'Question' })
export class QuestionDto {
  @ApiProperty({ enum: questionIds }) id!: Question['id'];
  @ApiProperty() text!: string;
  @ApiProperty({ type: [ChoiceDto] }) choices!: ChoiceDto[];
  @ApiProperty({ type: [String] }) examples!: string[];
}

/** A column of a file and what it seems to be. */
@ApiSchema({ name: 'ProposedColumn' })
export class ProposedColumnDto {
  @ApiProperty() index!: number;
  @ApiProperty() name!: string;
  @ApiProperty({ type: [String] }) samples!: string[];
  @ApiProperty({ type: String, nullable: true }) sensor!: string | null;
  @ApiProperty({ type: String, nullable: true }) unit!: string | null;
  @ApiProperty({ type: String, nullable: true }) note!: string | null;
}

/** How a file seems to be laid out. */
@ApiSchema({ name: 'Proposal' })
export class ProposalDto {
  @ApiProperty({ type: MappingInput }) mapping!: MappingInput;
  @ApiProperty({ enum: ['sample', 'last file'] }) from!: 'sample' | 'last file';
  @ApiProperty({ type: [String], description: 'All columns, by name' }) columnNames!: string[];
  @ApiProperty({ type: [ProposedColumnDto], description: 'All but those of the time' })
  columns!: ProposedColumnDto[];
  @ApiProperty({ type: [String], description: 'Long tables: the sensors as the file writes them' })
  written!: string[];
  @ApiProperty({ type: [String], nullable: true }) sheets!: string[] | null;
  @ApiProperty({ type: [String] }) notes!: string[];
  @ApiProperty({ type: [QuestionDto] }) questions!: QuestionDto[];
  @ApiProperty({ type: [String] }) sampleLines!: string[];
}

/** A value as it would be taken. */
@ApiSchema({ name: 'PreviewValue' })
export class PreviewValueDto {
  @ApiProperty() sensor!: string;
  @ApiProperty() value!: number;
  @ApiProperty() unit!: string;
}

/** A row as it would be taken. */
@ApiSchema({ name: 'PreviewRow' })
export class PreviewRowDto {
  @ApiProperty() rowNo!: number;
  @ApiProperty({ description: 'END of its interval' }) time!: string;
  @ApiProperty({ type: [PreviewValueDto] }) values!: PreviewValueDto[];
}

/** A row that would be refused. */
@ApiSchema({ name: 'PreviewRefusal' })
export class PreviewRefusalDto {
  @ApiProperty() row!: number;
  @ApiProperty({ type: String, nullable: true }) column!: string | null;
  @ApiProperty() code!: string;
  @ApiProperty() text!: string;
  @ApiProperty() raw!: string;
}

/** From when to when a sensor would get readings. */
@ApiSchema({ name: 'PreviewSpan' })
export class PreviewSpanDto {
  @ApiProperty() sensor!: string;
  @ApiProperty() from!: string;
  @ApiProperty() to!: string;
  @ApiProperty() count!: number;
  @ApiProperty() lowest!: number;
  @ApiProperty() highest!: number;
  @ApiProperty() unit!: string;
}

/** What importing a file would give; nothing is taken. */
@ApiSchema({ name: 'Preview' })
export class PreviewDto {
  @ApiProperty({ type: [PreviewRowDto], description: 'The first 30' }) rows!: PreviewRowDto[];
  @ApiProperty({ description: 'Readings' }) read!: number;
  @ApiProperty() refused!: number;
  @ApiProperty({ type: [PreviewRefusalDto], description: 'The first 100' }) refusedRows!: PreviewRefusalDto[];
  @ApiProperty({ type: [String] }) ignoredColumns!: string[];
  @ApiProperty({ type: [PreviewSpanDto] }) spans!: PreviewSpanDto[];
  @ApiProperty({ type: [QuestionDto] }) questions!: QuestionDto[];
  @ApiProperty({ type: [String], description: "What looks wrong beside the tower's own readings" })
  warnings!: string[];
  @ApiProperty({ description: 'Whether the whole file was looked at, not only its beginning' })
  whole!: boolean;
}
