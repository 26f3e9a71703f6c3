import { ApiProperty, ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { RangeValue } from './range-value.dto';

const number = { type: Number, nullable: true } as const;

/** A temperature level of a tower. */
@ApiSchema({ name: 'ProfileLevel' })
export class ProfileLevelDto {
  @ApiProperty() heightM!: number;
  @ApiProperty(number) temperatureC!: number | null;
  @ApiProperty() sigmaC!: number;
  @ApiProperty({ description: 'Readings in the mean' }) n!: number;
  @ApiProperty({ enum: ['valid', 'suspect', 'failed', 'missing'] }) quality!: string;
}

/** The air between two neighbouring levels; null where one of them is missing. */
@ApiSchema({ name: 'ProfileLayer' })
export class ProfileLayerDto {
  @ApiProperty() lowerM!: number;
  @ApiProperty() upperM!: number;
  @ApiProperty({ ...number, description: '−dT/dz: positive where it cools upward' }) lapseRateKPerKm!:
    number | null;
  @ApiProperty(number) sigmaKPerKm!: number | null;
  @ApiProperty({ type: String, nullable: true }) textbookClass!: string | null;
  @ApiProperty(number) probabilityTRises!: number | null;
  @ApiProperty({ ...number, description: 'Moist-adiabatic rate at its temperature and pressure' })
  moistLapseRateKPerKm!: number | null;
  @ApiProperty({ type: Boolean, nullable: true }) superadiabatic!: boolean | null;
  @ApiProperty({ type: Boolean, nullable: true }) autoconvective!: boolean | null;
}

/** The inversion that begins at the ground. */
@ApiSchema({ name: 'SurfaceInversion' })
export class SurfaceInversionDto {
  @ApiProperty() baseM!: number;
  @ApiProperty({ description: 'The lowest level at which its top can lie' }) topM!: number;
  @ApiProperty({ type: RangeValue }) depthM!: RangeValue;
  @ApiProperty({ type: RangeValue }) strengthC!: RangeValue;
  @ApiProperty() strengthWithinTowerC!: number;
  @ApiProperty(number) sigmaC!: number | null;
  @ApiProperty({ ...number, description: 'P(strength > 0)' }) probability!: number | null;
  @ApiProperty() gradientCPer100m!: number;
  @ApiProperty({ enum: ['no', 'at the top', 'cut by a missing level'] }) open!:
    'no' | 'at the top' | 'cut by a missing level';
  @ApiProperty({ description: 'A missing level lies just below' }) baseAtOrBelow!: boolean;
  @ApiProperty() sure!: boolean;
  @ApiProperty({ enum: ['plain', 'sensor-aware'] }) form!: string;
}

/** An inversion that begins above the ground. */
@ApiSchema({ name: 'ElevatedInversion' })
export class ElevatedInversionDto {
  @ApiProperty() baseM!: number;
  @ApiProperty() topM!: number;
  @ApiProperty({ type: RangeValue }) strengthC!: RangeValue;
  @ApiProperty() sure!: boolean;
}

/** One tower at the end of one block, with all that follows from it. */
@ApiSchema({ name: 'Profile' })
export class ProfileDto {
  @ApiProperty() towerId!: number;
  @ApiProperty({ description: 'End of the block' }) tEnd!: string;
  @ApiProperty() blockMinutes!: number;
  @ApiProperty({ description: 'Counts how often it was worked out anew with another result' }) rev!: number;
  @ApiProperty({ type: [ProfileLevelDto] }) levels!: ProfileLevelDto[];
  @ApiProperty({ type: [ProfileLayerDto], description: 'Between each two neighbouring levels the tower has' })
  layers!: ProfileLayerDto[];
  @ApiProperty({ enum: ['present', 'absent', 'not known'] }) surface!: 'present' | 'absent' | 'not known';
  @ApiPropertyOptional({ description: 'Why the surface finding is not known' }) reason?: string;
  @ApiProperty({ type: SurfaceInversionDto, nullable: true }) inversion!: SurfaceInversionDto | null;
  @ApiProperty({ type: [ElevatedInversionDto] }) elevated!: ElevatedInversionDto[];
  @ApiProperty({ type: RangeValue }) stableDepthM!: RangeValue;
  @ApiProperty({ type: RangeValue }) heatDeficitMJPerM2!: RangeValue;
  @ApiProperty({ type: RangeValue }) breakUpTemperatureC!: RangeValue;
  @ApiProperty() pressureHpa!: number;
  @ApiProperty({ description: 'The standard atmosphere’s, none being measured' }) pressureAssumed!: boolean;
  @ApiPropertyOptional() relativeHumidityPct?: number;
  @ApiPropertyOptional() windSpeedMPerS?: number;
  @ApiPropertyOptional() windDirectionDeg?: number;
  @ApiPropertyOptional({ description: 'Block mean, µg/m³' }) pm25?: number;
  @ApiPropertyOptional({ description: 'Mean of the hour that ends with the block, µg/m³' }) pm25Hour?: number;
}

/** Profiles in order of time, and where to go on. */
export class ProfileSpan {
  @ApiProperty({ type: [ProfileDto] }) items!: ProfileDto[];
  @ApiPropertyOptional({ description: 'Ask again with `from` set to this for what follows' }) next?: string;
}
