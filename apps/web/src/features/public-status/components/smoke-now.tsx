import { pm25Aqi } from '@lidwatch/atmosphere';
import type { Language } from '../../../components/public/language';
import { drawable } from '../../../lib/format/range';
import { decimal } from '../../../lib/format/number';
import type { PublicStatus } from '../public-status';
import { publicTime } from '../public-time';
import { PAGE_WORDS } from '../words/page-words';

/**
 * Smoke at the monitor by NowCast, with the AQI category: its official name, its official colour, an outline and text
 * that can be read on it. *Not known* is said as such.
 */
export function SmokeNow({ status, lang }: { status: PublicStatus; lang: Language }) {
  const words = PAGE_WORDS[lang];
  const { smoke, timeZone } = status;
  if (!smoke) return null;
  const pm25 = typeof smoke.pm25 === 'number' ? smoke.pm25 : drawable(smoke.pm25);
  const aqi = pm25 === null ? null : pm25Aqi(pm25);
  if (pm25 === null || !aqi) {
    return (
      <section>
        <h2>{words.smokeNotKnown}</h2>
      </section>
    );
  }
  return (
    <section>
      <h2>
        {words.smokeNow}: {decimal(Math.max(0, pm25), 0)} µg/m³
      </h2>
      <span className="aqi" style={{ background: aqi.colour, color: aqi.textColour }}>
        AQI {aqi.index ?? words.beyondIndex}: {words.category[aqi.category]}
      </span>
      <p>{words.advice[aqi.category]}</p>
      <p className="mute">
        {words.smokeBy}, {publicTime(smoke.at, timeZone, lang)}
      </p>
    </section>
  );
}
