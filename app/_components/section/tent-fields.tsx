'use client';

import { QuantityField } from '../quantity-field';
import { InspectorFrame } from './inspector';
import type { SectionContext } from './section-context';
import { DefaultField } from './tier-fields';

/** The tent's own body: it belongs to the tent, so every scenario in it changes with these. */
export function TentFields({ context }: { context: SectionContext }) {
  const { doc, edit, slots, evaluation } = context;
  const { tent } = doc;
  const setTent = slots.setTent;
  const locked = edit.readOnly !== null || !setTent;
  const lining = typeof tent.liningReflectanceFrac === 'number' ? tent.liningReflectanceFrac : undefined;
  const sixFaces = typeof tent.liningReflectanceFrac === 'object';
  const fabric = evaluation?.assumptions.find((each) => each.path === 'tent.fabricUWM2K');
  const fabricU = tent.fabricUWM2K ?? (typeof fabric?.value === 'number' ? fabric.value : 0);
  return (
    <InspectorFrame
      context={context}
      title="The tent itself"
      hint="These belong to the tent: all its scenarios change with them."
    >
      {(['widthM', 'depthM', 'heightM'] as const).map((key) => (
        <QuantityField
          key={key}
          label={{ widthM: 'Width inside', depthM: 'Depth inside', heightM: 'Height inside' }[key]}
          kind="tallLength"
          value={tent[key]}
          min={0.3}
          max={6}
          disabled={locked}
          onCommit={(value) => setTent?.({ [key]: value })}
        />
      ))}
      {sixFaces ? (
        <p className="text-12 text-ink-soft">The six faces of the lining are set one by one.</p>
      ) : (
        <DefaultField
          label="Lining throws back"
          kind="fraction"
          value={lining}
          defaultKey="tent.liningReflectanceFrac"
          min={0}
          max={0.99}
          disabled={locked}
          onCommit={(value) => setTent?.({ liningReflectanceFrac: value })}
        />
      )}
      <QuantityField
        label="Heat through the fabric"
        kind="uValue"
        value={fabricU}
        min={0}
        max={20}
        isDefault={tent.fabricUWM2K === undefined}
        defaultReason="Reckoned from the air films on both sides of a thin fabric."
        onConfirmDefault={() => setTent?.({ fabricUWM2K: Math.round(fabricU * 1000) / 1000 })}
        disabled={locked}
        onCommit={(value) => setTent?.({ fabricUWM2K: value })}
      />
      <DefaultField
        label="Air that leaks anyway"
        kind="airChanges"
        value={tent.leakageAch}
        defaultKey="tent.leakageAch"
        min={0}
        max={100}
        disabled={locked}
        onCommit={(value) => setTent?.({ leakageAch: value })}
      />
    </InspectorFrame>
  );
}
