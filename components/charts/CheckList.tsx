import { View } from 'react-native';

import type { Check } from '@/shared/model/check';

import { CheckRow } from './CheckRow';
import { MarginRuler } from './MarginRuler';

export interface CheckListProps {
  checks: readonly Check[];
  tight?: boolean;
  stale?: boolean;
  /** A check is told by its id and, where there are two limiters, by the element. */
  selected?: string | null;
  onSelect?: (check: Check) => void;
}

export const checkKey = ({ id, element }: Pick<Check, 'id' | 'element'>): string => (element === null ? id : `${id}.${element}`);

/** Checks in the order of the verdict, under one scale. */
export const CheckList = ({ checks, tight, stale, selected, onSelect }: CheckListProps) => (
  <View>
    <MarginRuler />
    <View role="list" aria-label="Checks, closest to failing first">
      {checks.map((check) => {
        const key = checkKey(check);
        return (
          <View key={key} role="listitem">
            <CheckRow check={check} tight={tight} stale={stale} selected={key === selected} onPress={onSelect && (() => onSelect(check))} />
          </View>
        );
      })}
    </View>
  </View>
);
