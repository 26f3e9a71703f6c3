import { checkNames, qualityName } from '@lidwatch/contracts';
import { Injectable } from '@nestjs/common';
import { fromIso, toIso } from '../common/instants';
import { Problem } from '../common/problem';
import { Sql } from '../database/sql';
import { unitsByQuantity } from '../towers/quantities';
import { versionAt } from '../towers/tower-layout';
import { TowerLayouts } from '../towers/tower-layouts';
import { checkWords } from './check-words';
import type {
  ReadingDetailDto,
  ReadingOriginDto,
  ReadingQuery,
  WordOnReadingDto,
} from './dto/reading-detail.dto';
import { sensorsOf } from './seen-sensors';

interface Came {
  readonly value: number;
  readonly importId: number;
  readonly rowNo: number;
  readonly name: string;
  readonly origin: string;
  readonly receivedAt: number;
}

const ORIGIN = 'r.value, r.import_id importId, r.row_no rowNo, i.name, i.origin, i.received_at receivedAt';
const READING = `SELECT ${ORIGIN}, r.quality, r.checks FROM reading r JOIN import i ON i.id = r.import_id
  WHERE r.sensor_id = $1 AND r.t_end = $2`;
const EARLIER = `SELECT ${ORIGIN}, r.until_at untilAt FROM reading_past r JOIN import i ON i.id = r.import_id
  WHERE r.sensor_id = $1 AND r.t_end = $2 ORDER BY r.seq DESC`;
const WORD = `SELECT o.quality, u.name "by", o.at, o.reason FROM override o JOIN user u ON u.id = o.by_user
  WHERE o.sensor_id = $1 AND o.undone_at IS NULL AND o.t0 <= $2 AND o.t1 >= $2 ORDER BY o.at DESC, o.id DESC LIMIT 1`;

const originOf = ({ importId, rowNo, name, origin, receivedAt }: Came): ReadingOriginDto => ({
  ...{ importId, rowNo, name, origin, receivedAt: toIso(receivedAt) },
});

/** A single reading, down to the file and row it came from. */
@Injectable()
export class ReadingDetailService {
  constructor(
    private readonly sql: Sql,
    private readonly layouts: TowerLayouts,
  ) {}

  /** One reading of a tower; 404 where the sensor has none that ends then. */
  async of(towerId: number, { sensorId, t }: ReadingQuery): Promise<ReadingDetailDto> {
    const [sensor] = sensorsOf(await this.layouts.of(towerId), sensorId);
    const tEnd = fromIso(t) ?? NaN;
    const row = await this.sql.get<Came & { quality: number; checks: number }>(READING, [sensorId, tEnd]);
    if (!sensor || !row) throw new Problem('not-found', `There is no reading that ends at ${t}.`);
    const earlier = await this.sql.all<Came & { untilAt: number }>(EARLIER, [sensorId, tEnd]);
    const word = await this.sql.get<Omit<WordOnReadingDto, 'at'> & { at: number }>(WORD, [sensorId, tEnd]);
    const quality = qualityName(row.quality);
    const { gain, offset } = versionAt(sensor, tEnd) ?? { gain: 1, offset: 0 };
    const checks = checkNames(row.checks).filter((check) => check !== 'override');
    return {
      ...{ sensorId, sensorName: sensor.name, unit: unitsByQuantity[sensor.quantity] },
      ...{ t: toIso(tEnd), value: row.value, corrected: gain * row.value + offset, quality },
      checks: checks.map((check) => ({ check, says: checkWords(check, sensor, quality) })),
      word: word ? { ...word, at: toIso(word.at) } : null,
      from: originOf(row),
      earlier: earlier.map((each) => ({
        ...{ value: each.value, until: toIso(each.untilAt), from: originOf(each) },
      })),
    };
  }
}
