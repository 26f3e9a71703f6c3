import type { Truth } from '@lidwatch/atmosphere';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { NoticeBrief } from '../../notices/dto/notice.dto';
import { ProfileLevelDto } from '../../profiles/dto/profile.dto';
import { RangeValue } from '../../profiles/dto/range-value.dto';
import { ProposalCard } from '../../proposals/dto/proposal.dto';

const truth = { enum: ['true', 'false', 'not known'] };
const range = { type: RangeValue };

/** The tower that answers for a district. */
export class SpeakerDto {
  @ApiProperty() towerId!: number;
  @ApiProperty() name!: string;
}

/** What is known of the surface inversion. "Absent" is never "clear": the lid may be above the mast. */
export class AirFinding {
  @ApiProperty({ enum: ['present', 'absent', 'not known'] }) surface!: 'present' | 'absent' | 'not known';
  @ApiProperty(range) strengthC!: RangeValue;
  @ApiProperty({ ...truth, description: 'Whether it is beyond what the sensors could mistake' }) sure!: Truth;
  @ApiProperty({ ...range, description: 'How long the episode has lasted' }) forMinutes!: RangeValue;
  @ApiPropertyOptional({
    description: 'Height of its top above ground; the lowest it can be where it is open',
  })
  topM?: number;
  @ApiProperty({ enum: ['no', 'at the top', 'cut by a missing level'] }) open!: string;
}

/** One district's air, as its newest block has it. */
export class DistrictAir {
  @ApiProperty() districtId!: number;
  @ApiProperty() slug!: string;
  @ApiProperty() name!: string;
  @ApiProperty() timeZone!: string;
  @ApiProperty({ type: String, nullable: true, format: 'date-time' }) tEnd!: string | null;
  @ApiProperty({ description: 'Whether the newest block is recent enough to speak for now' }) fresh!: boolean;
  @ApiPropertyOptional({ description: 'Why nothing is known of now' }) reason?: string;
  @ApiProperty({ type: SpeakerDto, nullable: true }) speaker!: SpeakerDto | null;
  @ApiProperty({ type: [String], description: 'Towers that gave nothing for this block' }) silent!: string[];
  @ApiProperty({ type: AirFinding }) finding!: AirFinding;
  @ApiProperty(truth) elevatedLid!: Truth;
  @ApiProperty(range) pm25Hour!: RangeValue;
  @ApiProperty(range) pm25NowCast!: RangeValue;
  @ApiProperty(range) pm25Running24h!: RangeValue;
  @ApiProperty(range) floorToBenchC!: RangeValue;
  @ApiProperty(range) heatDeficitMJPerM2!: RangeValue;
  @ApiProperty(range) breakUpTemperatureC!: RangeValue;
  @ApiProperty(range) mixingHeightM!: RangeValue;
  @ApiProperty(range) forecastLowC!: RangeValue;
  @ApiProperty(range) forecastWindMPerS!: RangeValue;
  @ApiProperty(range) windSpeedMPerS!: RangeValue;
  @ApiProperty(range) surfaceTemperatureC!: RangeValue;
  @ApiProperty({ type: [ProfileLevelDto] }) levels!: ProfileLevelDto[];
  @ApiProperty({ type: [NoticeBrief] }) inForce!: NoticeBrief[];
}

/** How lately a tower has given a block. */
export class TowerFreshness {
  @ApiProperty() id!: number;
  @ApiProperty() name!: string;
  @ApiProperty({ type: String, nullable: true, format: 'date-time' }) newest!: string | null;
  @ApiProperty() late!: boolean;
}

/** The whole desk at one look. */
export class Desk {
  @ApiProperty({ format: 'date-time' }) at!: string;
  @ApiProperty({ type: [DistrictAir] }) districts!: DistrictAir[];
  @ApiProperty({ type: [ProposalCard] }) proposals!: ProposalCard[];
  @ApiProperty({ type: [TowerFreshness] }) towers!: TowerFreshness[];
}
