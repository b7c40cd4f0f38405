import { isDirty, reduceDraft, startDraft, UNDO_STEPS, type DraftAction, type DraftState } from '@/hooks/scenario/draft-state';
import { draftOf, nodeAt } from '@/hooks/scenario/draft-tree';

import { readScenario, sampleRecord } from '../../support/sample-record';

const record = sampleRecord();
const later = sampleRecord({ version: 4, scenario: readScenario({ notes: 'from a colleague' }), updatedBy: 'Maridel Quost' });
const edit = (path: string, value: string, at: number): DraftAction => ({ type: 'edit', path, value, at });
const after = (...actions: DraftAction[]): DraftState => actions.reduce(reduceDraft, startDraft(record));
const capacitance = (state: DraftState) => nodeAt(state.present, 'bulk.capacitance.nominal');

describe('a draft that is edited', () => {
  it('keeps what was typed as it was typed', () => {
    expect(capacitance(after(edit('bulk.capacitance.nominal', '470u', 0)))).toBe('470u');
  });

  it('undoes a word typed in one go at once, and each field for itself', () => {
    const typed = after(edit('bulk.capacitance.nominal', '4', 0), edit('bulk.capacitance.nominal', '47', 300), edit('bulk.capacitance.nominal', '470u', 600), edit('load.resistance', '4k7', 900));
    const once = reduceDraft(typed, { type: 'undo' });
    expect(nodeAt(once.present, 'load.resistance')).toBe(1000);
    expect(capacitance(once)).toBe('470u');
    expect(capacitance(reduceDraft(once, { type: 'undo' }))).toBe(470e-6);
  });

  it('makes a step of its own of what is typed after a pause', () => {
    const typed = after(edit('bulk.capacitance.nominal', '330u', 0), edit('bulk.capacitance.nominal', '470u', 60_000), { type: 'undo' });
    expect(capacitance(typed)).toBe('330u');
  });

  it('goes back fifty steps and forward again', () => {
    const edits = Array.from({ length: 60 }, (_, index) => edit('load.resistance', `${index}k`, index * 10_000));
    const undos = Array.from({ length: 60 }, (): DraftAction => ({ type: 'undo' }));
    const back = after(...edits, ...undos);
    expect(nodeAt(back.present, 'load.resistance')).toBe(`${60 - UNDO_STEPS - 1}k`);
    const redos = Array.from({ length: 60 }, (): DraftAction => ({ type: 'redo' }));
    expect(nodeAt(redos.reduce(reduceDraft, back).present, 'load.resistance')).toBe('59k');
  });

  it('is clean again when everything was undone, so that nothing is sent', () => {
    expect(isDirty(after(edit('load.resistance', '4k7', 0)))).toBe(true);
    expect(isDirty(after(edit('load.resistance', '4k7', 0), { type: 'undo' }))).toBe(false);
  });

  it('changes two places in one step where one needs the other', () => {
    const state = after({ type: 'edit', path: 'source.kind', value: 'dc', also: [['rectifier', { kind: 'none' }]], at: 0 });
    expect(nodeAt(state.present, 'rectifier.kind')).toBe('none');
    expect(isDirty(reduceDraft(state, { type: 'undo' }))).toBe(false);
  });
});

describe('a draft that is saved', () => {
  it('goes on from the new version and keeps edits made while it was being sent', () => {
    const typed = after(edit('load.resistance', '4k7', 0));
    const more = reduceDraft(typed, edit('load.resistance', '5k6', 5000));
    const saved = reduceDraft(more, { type: 'saved', sent: typed.present, record: later });
    expect(saved.saved.version).toBe(4);
    expect(nodeAt(saved.present, 'load.resistance')).toBe('5k6');
    expect(isDirty(saved)).toBe(true);
  });

  it('takes a colleague’s version over while nothing is unsaved here', () => {
    const state = after({ type: 'changed-elsewhere', record: later });
    expect(nodeAt(state.present, 'notes')).toBe('from a colleague');
    expect(state.theirs).toBeNull();
  });

  it('puts a colleague’s version beside unsaved edits and overwrites neither', () => {
    const state = after(edit('load.resistance', '4k7', 0), { type: 'changed-elsewhere', record: later });
    expect(nodeAt(state.present, 'load.resistance')).toBe('4k7');
    expect(state.theirs?.version).toBe(4);
    const resolved = reduceDraft(state, { type: 'resolved', draft: state.present });
    expect(resolved.saved.version).toBe(4);
    expect(nodeAt(resolved.present, 'load.resistance')).toBe('4k7');
  });

  it('does not mistake an older answer that arrives late for a newer version', () => {
    const state = after(edit('load.resistance', '4k7', 0), { type: 'changed-elsewhere', record: sampleRecord({ version: 2 }) });
    expect(state.theirs).toBeNull();
  });
});

describe('a draft that an earlier visit left unsaved', () => {
  const kept = { draft: { ...draftOf(record.scenario), notes: 'not sent yet' }, version: record.version, base: record.scenario };

  it('is there again and can be undone', () => {
    const state = startDraft(record, kept);
    expect(nodeAt(state.present, 'notes')).toBe('not sent yet');
    expect(nodeAt(reduceDraft(state, { type: 'undo' }).present, 'notes')).toBe('');
  });

  it('stands beside what a colleague saved meanwhile', () => {
    expect(startDraft(later, kept).theirs?.version).toBe(4);
  });
});
