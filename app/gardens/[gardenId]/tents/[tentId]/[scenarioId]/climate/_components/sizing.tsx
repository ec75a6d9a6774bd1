'use client';

import { Sentence } from '@/app/_components/sentence';
import { CautionNote } from '@/app/_components/caution-note';
import { Explainable } from '@/app/_components/explain';
import { Figure } from '@/app/_components/figure';
import type { Evaluation, ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';

interface SizingProps {
  document: ScenarioDocument;
  evaluation: Evaluation;
}

/** What to buy, and what to mind before it is plugged in. */
export function Sizing({ document, evaluation }: SizingProps) {
  const { heat, cautions } = evaluation;
  const about = (...parts: string[]) =>
    cautions.filter((caution) => parts.some((part) => caution.code.startsWith(part)));
  return (
    <section className="grid grid-cols-1 gap-x-16 gap-y-10 border-t border-line pt-8 md:grid-cols-2">
      <div>
        <h2 className="text-22">A heater for this</h2>
        <p className="pt-2 text-17">
          {heat.recommendedHeaterW > 0 ? (
            <Explainable path="heat.recommendedHeater">
              <Figure value={heat.recommendedHeaterW} kind="power" bold />
            </Explainable>
          ) : (
            'None is needed.'
          )}
          {!document.climate.heater && heat.recommendedHeaterW > 0 && (
            <span className="text-14 text-ink-soft"> None is planned; “A heater” in the section puts one in.</span>
          )}
          {document.climate.heater && (
            <span className="text-14 text-ink-soft">
              {' '}
              You plan <Figure value={document.climate.heater.ratedPowerW} kind="power" />.
            </span>
          )}
        </p>
        <div className="flex flex-col gap-3 pt-4">
          {about('heater.', 'circuit.noneForHeater').map((caution) => (
            <CautionNote
              key={caution.code}
              severity={caution.severity}
              text={<Sentence text={caution.text} />}
              source={caution.source}
            />
          ))}
        </div>
      </div>
      <div>
        <h2 className="text-22">A fan for this</h2>
        <p className="pt-2 text-17">
          {heat.recommendedExhaustM3H === null ? (
            'No fan can do it: the room’s air is too warm or too moist.'
          ) : (
            <Figure value={heat.recommendedExhaustM3H} kind="airflow" bold />
          )}
          {document.climate.exhaust && (
            <span className="text-14 text-ink-soft">
              {' '}
              You plan up to <Figure value={document.climate.exhaust.maxAirflowM3H} kind="airflow" />.
            </span>
          )}
        </p>
        <ul className="pt-2 text-14 text-ink-soft">
          <AirLine
            words="for heat, on the hot day"
            value={heat.hotLight.exhaustAirflowM3H}
            path="heat.hotLight.exhaust"
          />
          <AirLine
            words="for moisture, lamps on"
            value={heat.moistureAirflowM3H.light}
            path="heat.moistureAirflow.light"
          />
          <AirLine
            words="for moisture, lamps off"
            value={heat.moistureAirflowM3H.dark}
            path="heat.moistureAirflow.dark"
          />
        </ul>
        <p className="pt-3 text-14">
          With the tent held warm, the wall stands{' '}
          <Explainable path="heat.wallDewMargin">
            <Figure value={Math.abs(heat.wallDewMarginK)} kind="temperatureDifference" />
          </Explainable>{' '}
          {heat.wallDewMarginK < 0 ? 'below the dew point: it sweats.' : 'above the dew point: it stays dry.'}
        </p>
        <div className="flex flex-col gap-3 pt-4">
          {about('air.').map((caution) => (
            <CautionNote
              key={caution.code}
              severity={caution.severity}
              text={<Sentence text={caution.text} />}
              source={caution.source}
            />
          ))}
        </div>
      </div>
    </section>
  );
}

function AirLine({ words, value, path }: { words: string; value: number | null; path: string }) {
  return (
    <li>
      {value === null ? (
        'no airflow is enough'
      ) : (
        <Explainable path={path}>
          <Figure value={value} kind="airflow" />
        </Explainable>
      )}{' '}
      {words}
    </li>
  );
}
