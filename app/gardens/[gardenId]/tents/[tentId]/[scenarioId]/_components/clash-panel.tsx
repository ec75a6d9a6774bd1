'use client';

/** Two people, one figure: both stand here with what they mean, the page goes on with mine, and nothing is lost. */
import { useMemo, useState } from 'react';
import { Button } from '@/app/_components/button';
import { tierName } from '@/app/_components/section/tier-names';
import { useUnits } from '@/app/_components/units-context';
import { evaluateScenario, type ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import type { Plan } from '@/lib/scenarios/plan.schema';
import { useCopyScenario } from '@/lib/scenarios/scenario.hooks';
import type { Workbench } from '@/lib/scenarios/scenario.schema';
import { setAtPath } from '@/lib/scenarios/merge-plans';
import type { PlanEditor } from '@/lib/scenarios/use-plan-editor';
import { clashWords } from './clash-words';

interface ClashPanelProps {
  workbench: Workbench;
  editor: PlanEditor<Plan>;
  theirs: ScenarioDocument;
  documentOf: (plan: Plan) => ScenarioDocument;
}

export function ClashPanel({ workbench, editor, theirs, documentOf }: ClashPanelProps) {
  const { clash, settled, choose } = editor;
  const units = useUnits();
  const copy = useCopyScenario(workbench.garden.gardenId);
  const [kept, setKept] = useState<string | null>(null);
  if (!clash) return null;
  const doc = documentOf(settled);
  const who = clash.theirName ?? 'somebody else';
  const keepBoth = () => {
    const plan = clash.conflicts.reduce((from, conflict) => setAtPath(from, conflict.path, conflict.theirs), settled);
    const name = `${workbench.scenario.name.slice(0, 50)}, as ${who} has it`.slice(0, 80);
    copy.mutate(
      { fromId: workbench.scenario.scenarioId, name, plan },
      {
        onSuccess: () => {
          for (const conflict of clash.conflicts) choose(conflict.path, 'mine');
        },
        onError: () => setKept('The other could not be laid beside yet. Both still stand here.'),
      },
    );
  };
  return (
    <section aria-label="Two answers" data-clash="" className="flex flex-col gap-4">
      <h2 className="text-14 font-semibold text-lamp-ink">
        {clash.conflicts.length === 1
          ? 'One figure has two answers'
          : `${clash.conflicts.length} figures have two answers`}
      </h2>
      {clash.conflicts.map((conflict) => {
        const words = clashWords(conflict, doc, units);
        return (
          <div key={conflict.path} className="flex flex-col gap-2">
            <p className="text-12 text-ink-soft">
              {words.thing}: {words.figure.charAt(0).toLowerCase() + words.figure.slice(1)}
            </p>
            <Answer
              rule="border-lamp"
              value={words.mine}
              whose="yours"
              verb="Keep yours"
              onClick={() => choose(conflict.path, 'mine')}
            />
            <Answer
              rule="border-slate"
              value={words.theirs}
              whose={`${who}’s${clash.theirsAt ? `, ${new Date(clash.theirsAt).toLocaleTimeString('en-GB', { hour: '2-digit', minute: '2-digit' })}` : ''}`}
              verb="Take theirs"
              onClick={() => choose(conflict.path, 'theirs')}
            />
          </div>
        );
      })}
      <Outcomes mine={doc} theirs={theirs} />
      {workbench.can['scenario.create'] && (
        <div>
          <Button onClick={keepBoth} busy={copy.isPending && 'Laying it beside'}>
            Keep both
          </Button>
          <p className="pt-1 text-12 text-ink-soft">Theirs becomes a scenario of its own, beside this one.</p>
        </div>
      )}
      <p className="text-12 text-ink-soft">
        {kept ??
          `Until you choose, the page stands for yours. ${clash.mineOnly} of your changes and ${clash.theirsOnly} of theirs needed no choice and are in.`}
      </p>
    </section>
  );
}

interface AnswerProps {
  rule: string;
  value: string;
  whose: string;
  verb: string;
  onClick: () => void;
}

function Answer({ rule, value, whose, verb, onClick }: AnswerProps) {
  return (
    <div className={`border-l-[3px] pl-3 ${rule}`}>
      <p className="text-17 font-semibold">{value}</p>
      <p className="text-12 text-ink-soft">{whose}</p>
      <button
        type="button"
        className="min-h-6 cursor-pointer touch-44 text-14 font-semibold link-does"
        onClick={onClick}
      >
        {verb}
      </button>
    </div>
  );
}

/** What either answer means for each tier. */
function Outcomes({ mine, theirs }: { mine: ScenarioDocument; theirs: ScenarioDocument }) {
  const rows = useMemo(() => {
    const of = (doc: ScenarioDocument) => {
      try {
        return evaluateScenario(doc, { year: false });
      } catch {
        return null;
      }
    };
    const [ours, others] = [of(mine), of(theirs)];
    return mine.tiers.map((tier) => {
      const figure = (from: typeof ours) => {
        const result = from?.tiers.find((each) => each.id === tier.id);
        return result
          ? `${result.dliMolM2D.mean.toFixed(1)} mol, evenness ${result.ppfdUmolM2S.minOverMean.toFixed(2)}`
          : 'not there';
      };
      return { id: tier.id, name: tierName(mine.tiers, tier.id), mine: figure(ours), theirs: figure(others) };
    });
  }, [mine, theirs]);
  if (rows.length === 0) return null;
  return (
    <table className="w-full max-w-96 border-collapse text-12">
      <caption className="sr-only">Light with either answer</caption>
      <thead>
        <tr className="border-b border-ink text-left text-ink-soft">
          <th scope="col" className="py-1 pr-3 font-normal">
            Light a day
          </th>
          <th scope="col" className="py-1 pr-3 font-normal">
            yours
          </th>
          <th scope="col" className="py-1 font-normal">
            theirs
          </th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={row.id} className="border-b border-line">
            <th scope="row" className="py-1 pr-3 text-left font-normal">
              {row.name}
            </th>
            <td className="py-1 pr-3">{row.mine}</td>
            <td className="py-1">{row.theirs === row.mine ? 'same' : row.theirs}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
