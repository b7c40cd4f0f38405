/** A symbol is drawn into a box of 132 × 68 whose wire runs at y = 38; the strip draws the wire, the symbol covers it with `ground`. */
export interface SymbolProps {
  stroke: string;
  ground: string;
}
export const SYMBOL_BOX = { width: 132, height: 68, wireY: 38, line: 1.6 } as const;
