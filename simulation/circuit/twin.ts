import { Circuit } from './circuit';

/** The same circuit in the same state with the source at its zero at t = 0: for cycles looked at beside a run. */
export const twinOf = (circuit: Circuit): Circuit => {
  const { path } = circuit;
  const twin = new Circuit({ ...path, source: { ...path.source, phase: 0, programme: [] } });
  twin.loadSince = circuit.loadSince === null ? null : -Infinity;
  twin.faulted = circuit.faulted;
  circuit.closed.forEach((closed, k) => (twin.closed[k] = closed));
  return twin;
};
