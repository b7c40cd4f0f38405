import Svg, { Circle, G, Path, Rect } from 'react-native-svg';

import { useTheme } from '@/components/ui/theme';
import type { PathGlyph as GlyphPath } from '@/shared/contracts/scenario';

const CELL = { width: 30, height: 26 } as const;

type Element = GlyphPath['elements'][number];
const SLASH = { ntc: 'M9 20L20 5h4', 'polymer-ptc': 'M9 20L20 5h4M26 19v5M23.5 21.5h5', resistor: '' } as const;
const SLASH_UNDER_CONTACT = { ntc: 'M9 20L20 7h2', 'polymer-ptc': 'M9 20L20 7h2M26 19v5M23.5 21.5h5', resistor: '' } as const;

const SourceGlyph = ({ source }: Pick<GlyphPath, 'source'>) => (
  <>
    <Circle cx={15} cy={13} r={7} />
    <Path d={source === 'ac' ? 'M10.5 13c1.5-4 3-4 4.5 0s3 4 4.5 0M22 13h8' : 'M22 13h8M11 11.5h8M11 15h2M14 15h2M17 15h2'} />
  </>
);
const FuseGlyph = () => (
  <>
    <Path d="M0 13h30" />
    <Rect x={6} y={9.5} width={18} height={7} />
  </>
);
const ElementGlyph = ({ kind, bypass }: Element) => (
  <>
    <Path d={`M0 13h6M24 13h6${(bypass ? SLASH_UNDER_CONTACT : SLASH)[kind]}${bypass ? 'M3 13V3h8M27 13V3h-8M11 3l7-3' : ''}`} />
    <Rect x={6} y={9.5} width={18} height={7} />
  </>
);
const BridgeGlyph = () => (
  <>
    <Path d="M0 13h7M23 13h7M12 9v8l6-4zM18 9v8" />
    <Rect x={7} y={5} width={16} height={16} />
  </>
);
const CapacitorGlyph = () => <Path d="M0 13h30M15 13v3M9 16h12M9 19.5h12M15 19.5v5" />;
const LoadGlyph = ({ load }: Pick<GlyphPath, 'load'>) => {
  if (load === 'none') return <Path d="M0 13h12M12 13a2.5 2.5 0 1 0 5 0a2.5 2.5 0 1 0 -5 0" />;
  if (load === 'resistance') return <Path d="M0 13h15v1M11 14h8v8h-8zM15 22v3M12 25h6" />;
  return (
    <>
      <Path d="M0 13h7M7 21L23 5" />
      <Rect x={7} y={5} width={16} height={16} />
    </>
  );
};

const describe = (path: GlyphPath): string => {
  const elements = path.elements.map(({ kind, bypass }) => `${{ ntc: 'NTC', 'polymer-ptc': 'polymer PTC', resistor: 'resistor' }[kind]}${bypass ? ' with contact' : ''}`);
  const load = { 'constant-power': 'converter', resistance: 'resistive load', none: 'no load' }[path.load];
  return [`${path.source.toUpperCase()} source`, path.fuse && 'fuse', ...elements, path.rectifier === 'bridge' && 'bridge', 'bulk capacitor', load].filter(Boolean).join(', ');
};

/** The path of a scenario in a list, one glyph of 30 × 26 a block. */
export const PathGlyph = ({ path, faint = false }: { path: GlyphPath; faint?: boolean }) => {
  const { colors } = useTheme();
  const glyphs = [
    <SourceGlyph key="source" source={path.source} />,
    ...(path.fuse ? [<FuseGlyph key="fuse" />] : []),
    ...path.elements.map((element, index) => <ElementGlyph key={`element-${index}`} {...element} />),
    ...(path.rectifier === 'bridge' ? [<BridgeGlyph key="bridge" />] : []),
    <CapacitorGlyph key="bulk" />,
    <LoadGlyph key="load" load={path.load} />,
  ];
  const width = glyphs.length * CELL.width;
  return (
    <Svg width={width} height={CELL.height} viewBox={`0 0 ${width} ${CELL.height}`} fill="none" stroke={faint ? colors.rule2 : colors.ink} strokeWidth={1.3} role="img" aria-label={describe(path)}>
      {glyphs.map((glyph, index) => <G key={glyph.key} x={index * CELL.width}>{glyph}</G>)}
    </Svg>
  );
};
