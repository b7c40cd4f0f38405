import { useState } from 'react';
import { ScrollView, View } from 'react-native';

import { Button } from '@/components/ui/Button';

import { BenchChecks, BenchEditor, BenchPlot, BenchStrip, BenchVerdict } from './BenchParts';
import type { Bench } from './useBench';

const PLOT_HEIGHT = 392;

/** Phone: verdict, path, plot, checks, fields below one another; while a block is edited its fields come right below the path. */
export const BenchNarrow = ({ bench }: { bench: Bench }) => {
  const [editing, setEditing] = useState(false);
  const goTo = (path: string) => {
    setEditing(true);
    bench.goTo(path);
  };
  const inside = { ...bench, goTo };
  const editor = <View style={{ padding: 16, gap: 12 }}>
    <BenchEditor bench={inside} />
    {editing ? <Button label="Done" kind="primary" onPress={() => setEditing(false)} /> : null}
  </View>;
  return (
    <ScrollView style={{ flex: 1 }} keyboardShouldPersistTaps="handled">
      <BenchVerdict bench={inside} collapsed={editing} />
      <BenchStrip bench={inside} onSelect={() => setEditing(true)} />
      {editing ? editor : null}
      <View style={{ paddingHorizontal: 16, paddingTop: 14 }}><BenchPlot bench={inside} height={PLOT_HEIGHT} /></View>
      <View style={{ paddingHorizontal: 16, paddingTop: 20 }}><BenchChecks bench={inside} tight={false} /></View>
      {editing ? null : editor}
    </ScrollView>
  );
};
