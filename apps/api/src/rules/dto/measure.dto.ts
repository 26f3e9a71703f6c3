import { comparisonsFor, MEASURE_NAMES, MEASURES } from '@lidwatch/rules';
import { ApiProperty, ApiSchema } from '@nestjs/swagger';

/** A name in each language. */
export class LabelDto {
  @ApiProperty() en!: string;
  @ApiProperty() es!: string;
}

/** Something a rule may ask about. */
@ApiSchema({ name: 'Measure' })
export class MeasureDto {
  @ApiProperty() name!: string;
  @ApiProperty({ enum: ['number', 'yes-no'] }) kind!: string;
  @ApiProperty() unit!: string;
  @ApiProperty({ type: LabelDto }) label!: LabelDto;
  @ApiProperty() docs!: string;
  @ApiProperty({ type: [String], description: 'Comparisons that make sense for it' }) ops!: string[];
  @ApiProperty({ description: 'The smallest limit a rule may set' }) least!: number;
  @ApiProperty({ description: 'The largest limit a rule may set' }) most!: number;
}

/** Everything a rule may ask about. */
export function showMeasures(): MeasureDto[] {
  return MEASURE_NAMES.map((name) => {
    const { kind, unit, label, docs, possible } = MEASURES[name];
    const ops = [...comparisonsFor(name)];
    return { name, kind, unit, label, docs, ops, least: possible.lo, most: possible.hi };
  });
}
