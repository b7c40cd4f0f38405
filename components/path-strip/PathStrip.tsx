import { useEffect, useId, useRef } from 'react';
import { ScrollView, View } from 'react-native';

import { focusControl, onKeys } from '@/components/ui/keys';
import { useLayout, useTheme } from '@/components/ui/theme';
import { STATUS_COLOR, type ColorName } from '@/components/ui/tokens';

import { StripTab } from './StripTab';
import type { StripBlock } from './strip-block';

export type { StripBlock, StripLine, StripMark } from './strip-block';

export interface PathStripProps {
  blocks: readonly StripBlock[];
  selected: string;
  onSelect: (key: string) => void;
  /** Marks are from before the last edit. */
  stale?: boolean;
  /** id of the panel that the tabs steer, for a screen reader. */
  controls?: string;
}

const BLOCK_WIDTH = 158;
const HEIGHT = { phone: 148, wide: 150 } as const;

const indexTone = (block: StripBlock, on: boolean): ColorName => {
  if (on) return 'ink';
  const status = block.mark?.status;
  return status === 'fail' || status === 'caution' ? STATUS_COLOR[status] : 'rule2';
};

/** Which block is in the middle, and which blocks carry a mark, when not all are in sight. */
const StripIndex = ({ blocks, selected }: Pick<PathStripProps, 'blocks' | 'selected'>) => {
  const { colors } = useTheme();
  return (
    <View aria-hidden style={{ position: 'absolute', left: 16, right: 16, bottom: 0, flexDirection: 'row', alignItems: 'flex-end', gap: 4, pointerEvents: 'none' }}>
      {blocks.map((block) => {
        const on = block.key === selected;
        return <View key={block.key} style={{ flex: 1, height: on ? 4 : 2, backgroundColor: colors[indexTone(block, on)] }} />;
      })}
    </View>
  );
};

/** The power-up path as a one-line circuit, and the way into each of its blocks. Arrow keys walk along it. */
export const PathStrip = ({ blocks, selected, onSelect, stale = false, controls }: PathStripProps) => {
  const { colors } = useTheme();
  const { wide, width } = useLayout();
  const scroll = useRef<ScrollView>(null);
  const strip = useId();
  const at = Math.max(0, blocks.findIndex((block) => block.key === selected));

  useEffect(() => {
    if (!wide) scroll.current?.scrollTo({ x: Math.max(0, at * BLOCK_WIDTH - (width - BLOCK_WIDTH) / 2), animated: false });
  }, [at, wide, width]);

  const walk = (to: number) => {
    const block = blocks[Math.min(Math.max(to, 0), blocks.length - 1)];
    if (!block) return;
    onSelect(block.key);
    focusControl(`${strip}${block.key}`);
  };
  const onKey = (key: string): boolean => {
    const target = { ArrowLeft: at - 1, ArrowRight: at + 1, Home: 0, End: blocks.length - 1 }[key];
    if (target === undefined) return false;
    walk(target);
    return true;
  };

  const row = (
    <View role="tablist" aria-label="Power-up path" {...onKeys(onKey)} style={{ flexDirection: 'row', flexGrow: 1, height: wide ? HEIGHT.wide : HEIGHT.phone }}>
      {blocks.map((block) => (
        <StripTab key={block.key} id={`${strip}${block.key}`} block={block} on={block.key === selected} stale={stale} controls={controls} width={wide ? undefined : BLOCK_WIDTH}
          onPress={() => onSelect(block.key)} />
      ))}
    </View>
  );
  return (
    <View style={{ backgroundColor: colors.panel, borderBottomWidth: 1, borderBottomColor: colors.rule2 }}>
      {wide ? row : <ScrollView ref={scroll} horizontal showsHorizontalScrollIndicator={false}>{row}</ScrollView>}
      {wide ? null : <StripIndex blocks={blocks} selected={selected} />}
    </View>
  );
};
