import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { sensorQuantities, type SensorQuantity } from '../../towers/quantities';

/** A sensor as calendars and charts name it. */
@ApiSchema({ name: 'SeenSensor' })
export class SeenSensorDto {
  @ApiProperty() sensorId!: number;
  @ApiProperty() name!: string;
  @ApiProperty({ enum: sensorQuantities }) quantity!: SensorQuantity;
  @ApiProperty() unit!: string;
  @ApiProperty({ description: 'Above ground, as it is now' }) heightM!: number;
}

/** One sensor's readings of one day. */
@ApiSchema({ name: 'DayOfSensor' })
export class DayOfSensorDto {
  @ApiProperty() sensorId!: number;
  @ApiProperty({ description: "By the tower's interval, from its first reading up to now" })
  expected!: number;
  @ApiProperty() taken!: number;
  @ApiProperty() suspect!: number;
  @ApiProperty() failed!: number;
  @ApiProperty({
    type: Number,
    nullable: true,
    description: 'Readings that can be used (taken and not failed) of those expected; null where none is',
  })
  completenessPercent!: number | null;
}

/** One day, midnight to midnight in the zone; 23 or 25 h long where the clocks change. */
@ApiSchema({ name: 'CalendarDay' })
export class CalendarDayDto {
  @ApiProperty({ example: '2026-01-31' }) day!: string;
  @ApiProperty() from!: string;
  @ApiProperty() to!: string;
  @ApiProperty({ type: [DayOfSensorDto], description: 'In the order of the sensors' })
  sensors!: DayOfSensorDto[];
}

/** How complete a tower's readings are. */
@ApiSchema({ name: 'TowerCalendar' })
export class TowerCalendarDto {
  @ApiProperty() towerId!: number;
  @ApiProperty({ description: "That of the tower's first district; UTC where it has none" })
  timeZone!: string;
  @ApiProperty({ type: [SeenSensorDto] }) sensors!: SeenSensorDto[];
  @ApiProperty({ type: [CalendarDayDto] }) days!: CalendarDayDto[];
}
