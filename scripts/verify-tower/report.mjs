const REFUSED_SHOWN = 10;

const byCode = (rows) => {
  const counts = {};
  for (const { code } of rows) counts[code] = (counts[code] ?? 0) + 1;
  return Object.entries(counts).map(([code, n]) => `${n} × ${code}`);
};

/** Says what was sent and how it compares, in plain lines. */
export function report(sent, result, print = console.log) {
  print(
    `Readings: ${sent.new} new, ${sent.repeated} repeated, ${sent.corrected} corrected, ${sent.refused} refused.`,
  );
  if (sent.ignoredColumns.size > 0) print(`Columns passed over: ${[...sent.ignoredColumns].join(' | ')}`);
  if (sent.refusedRows.length > 0) {
    print(`Refused, of the first ${sent.refusedRows.length}: ${byCode(sent.refusedRows).join(', ')}`);
    for (const { text } of sent.refusedRows.slice(0, REFUSED_SHOWN)) print(`  ${text}`);
  }
  print(`Compared: ${result.compared.join(', ') || 'no column'}`);
  print(
    `Stamps compared: ${result.stamps}; passed over (repeated, not alone in their block, not in the file): ${result.passedOver}.`,
  );
  print(`Values compared: ${result.values}, agree ${result.agree}, differ ${result.differ}.`);
  for (const [kind, apart] of Object.entries(result.largest))
    print(`  largest difference, ${kind}: ${apart.toPrecision(3)}`);
  for (const { stamp, column, wanted, said } of result.shown) {
    print(`  DIFFERS ${stamp} ${column}: truth ${wanted}, service ${said}`);
  }
  print(verdict(result));
}

const verdict = ({ values, differ }) => {
  if (values === 0) return 'NOTHING COMPARED: no stamp of the truth stands alone in the readings file.';
  return differ === 0 ? 'HOLDS: every compared value agrees.' : `DOES NOT HOLD: ${differ} values differ.`;
};

/** Whether the run holds: something was compared and all of it agrees. */
export const holds = ({ values, differ }) => values > 0 && differ === 0;
