import { View } from 'react-native';

import { CheckList } from '@/components/charts/CheckList';
import { PathStrip } from '@/components/path-strip/PathStrip';
import { LegendBracket } from '@/components/ui/LegendBracket';
import { Notice } from '@/components/ui/Notice';
import { errorSentence } from '@/hooks/api/error-sentence';

import { EditorPanel } from './EditorPanel';
import { IssueList } from './IssueList';
import { EmptyPlot } from './result/EmptyPlot';
import { PlotPanel } from './result/PlotPanel';
import { VerdictTile } from './result/VerdictTile';
import type { Bench } from './useBench';

const PANEL = 'figures-of-the-path';

export const BenchStrip = ({ bench, onSelect }: { bench: Bench; onSelect?: () => void }) => (
  <PathStrip
    blocks={bench.blocks}
    selected={bench.block}
    stale={bench.stale}
    controls={PANEL}
    onSelect={(key) => {
      bench.select(key);
      onSelect?.();
    }}
  />
);

/** The verdict; while none is there yet, or the run was refused, the word for that. */
export const BenchVerdict = ({ bench, collapsed = false }: { bench: Bench; collapsed?: boolean }) => {
  const { run, controls, stale } = bench;
  return (
    <>
      {run.assessment ? <VerdictTile assessment={run.assessment} scenario={controls.scenario} stale={stale} collapsed={collapsed} /> : null}
      {run.error ? <View style={{ padding: 8 }}><Notice kind="error" title="Not computed" action={{ label: 'Try again', onPress: run.retry }}>{errorSentence(run.error)}</Notice></View> : null}
      <IssueList draft={controls.draft} issues={controls.issues} onGoTo={bench.goTo} />
    </>
  );
};

export const BenchChecks = ({ bench, tight }: { bench: Bench; tight: boolean }) => {
  const checks = bench.run.assessment?.checks ?? [];
  return (
    <View style={{ gap: 4 }}>
      <LegendBracket title="Checks" remark="closest to failing first" />
      <CheckList checks={checks} tight={tight} stale={bench.stale} onSelect={bench.openCheck} />
    </View>
  );
};

export const BenchPlot = ({ bench, height }: { bench: Bench; height: number }) => {
  const { run, controls, stale, block } = bench;
  if (!run.assessment) return <EmptyPlot text="Computing the first run" height={height} />;
  const element = block === 'limiter.1' ? 1 : 0;
  return <PlotPanel assessment={run.assessment} scenario={controls.scenario} stale={stale} milliseconds={run.milliseconds} element={element} height={height} onGoTo={bench.goTo} />;
};

export const BenchEditor = ({ bench }: { bench: Bench }) => (
  <EditorPanel id={PANEL} block={bench.block} page={bench.page} onPage={bench.setPage} scenario={bench.controls.scenario} assessment={bench.run.assessment} />
);
