import { Injectable } from '@nestjs/common';
import { invalid } from '../../common/validation';
import type { MappingInput } from '../../towers/dto/mapping.dto';
import type { TowerLayout } from '../../towers/tower-layout';
import { foreignUnitNames, suits, type ForeignUnit } from '../../towers/units';

/** Whether a mapping makes sense for a tower. */
@Injectable()
export class MappingChecks {
  /** @throws Problem `invalid`, each fault beside its field. */
  check(tower: TowerLayout, mapping: MappingInput): void {
    const inUse = new Map(
      tower.sensors
        .filter(({ retiredAt }) => retiredAt === null)
        .map((sensor) => [sensor.name, sensor] as const),
    );
    const errors: { field: string; text: string }[] = [];
    const columns = Object.entries(mapping.columns ?? {});
    for (const [column, name] of columns) {
      if (!inUse.has(name)) {
        const text = `This tower has no sensor "${name}" in use. Choose another, or leave the column out.`;
        errors.push({ field: `mapping.columns.${column}`, text });
      }
    }
    for (const [column, unit] of Object.entries(mapping.units ?? {})) {
      const sensor = inUse.get(mapping.columns?.[column] ?? '');
      if (!foreignUnitNames.includes(unit)) {
        const text = `The unit "${String(unit)}" is not known. Choose one of ${foreignUnitNames.join(', ')}.`;
        errors.push({ field: `mapping.units.${column}`, text });
      } else if (sensor && !suits(unit as ForeignUnit, sensor.quantity)) {
        const text = `${sensor.quantity} does not come in ${unit}. Choose another unit or sensor.`;
        errors.push({ field: `mapping.units.${column}`, text });
      }
    }
    if (errors.length > 0) throw invalid(errors);
  }
}
