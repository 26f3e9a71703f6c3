/**
 * How far beyond its own span a change of readings is followed, s: screening looks 12 h and two gaps around, a
 * district's episodes and running means somewhat less.
 */
export const REACH_S = 14 * 3600;

/** The districts in which a tower ($1) has a part, as a query of `district_id`. */
export const DISTRICTS_OF_TOWER = `SELECT district_id FROM district_tower WHERE tower_id = $1
  UNION SELECT id FROM district WHERE $1 IN (floor_tower_id, bench_tower_id, pm25_tower_id)`;
