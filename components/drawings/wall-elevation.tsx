import { useId } from 'react';
import { faded } from '@/components/drawings/fade-time';
import { courseLines, type OpeningKind, type PlacedOpening, placeOpenings } from '@/lib/plan/elevation';
import { type WallCover } from '@/lib/sun/wall-face';

type WallElevationProps = {
  name: string;
  widthM: number;
  heightM: number;
  gableHeightM?: number;
  eaveDepthM?: number;
  /** How far the roof rises behind a wall without a gable, m. */
  roofRiseM?: number;
  /** Exposed face of one course, m. */
  courseM?: number;
  openings?: readonly OpeningKind[];
  /** A porch roof or deck; drawn over the middle, as only its share of the width is known. */
  cover?: WallCover | undefined;
  colorHex?: string;
  /** Share of coat life used up, 0 to 1: the wall is drawn that much faded. */
  used?: number;
  /** Said in place of the wall's measures, in the reader's units. */
  words?: string;
};

const per = 40;

/** A wall from the front, to scale: courses, log ends, gable, doors and windows, the edge of the eave, a porch roof. */
export function WallElevation({ name, widthM, heightM, gableHeightM = 0, eaveDepthM = 0.45, roofRiseM = 0, courseM = 0.19, openings = [], cover, colorHex = '#8a5a32', used = 0, words }: WallElevationProps) {
  const clip = useId().replace(/[^a-zA-Z0-9-]/g, '');
  const [w, h, g] = [widthM * per, heightM * per, gableHeightM * per];
  const over = Math.min(eaveDepthM, 1.2) * per;
  const margin = Math.max(over, 14) + 10;
  const rise = g > 0 ? 0 : roofRiseM * per;
  const top = -h - g - rise - 16;
  const face = `M0 0V${-h}${g > 0 ? `L${w / 2} ${-h - g}L${w} ${-h}` : `H${w}`}V0Z`;
  return (
    <svg viewBox={`${-margin} ${top} ${w + 2 * margin} ${-top + 12}`} className="block h-auto w-full" role="img" aria-label={words ?? `${name} from the front`}>
      <clipPath id={clip}>
        <path d={face} />
      </clipPath>
      <path d={face} fill={faded(colorHex, used)} />
      <g clipPath={`url(#${clip})`}>
        {courseLines(heightM + gableHeightM, courseM).map((y) => (
          <g key={y}>
            <rect x="0" y={-y * per - 2.5} width={w} height="2.5" fill="rgb(0 0 0 / 38%)" />
            <rect x="0" y={-y * per} width={w} height="1.5" fill="rgb(255 255 255 / 22%)" />
          </g>
        ))}
      </g>
      <LogEnds height={heightM} courseM={courseM} xs={[0, w]} color={faded(colorHex, used)} />
      {placeOpenings({ widthM, heightM }, openings).map((opening) => (
        <Opening key={opening.x} opening={opening} />
      ))}
      {cover ? <CoverEdge w={w} h={h} cover={cover} /> : null}
      <Roof w={w} h={h} g={g} over={over} rise={rise} />
      <line x1={-margin} x2={w + margin} y1="1" y2="1" stroke="var(--ink)" strokeWidth="3" />
    </svg>
  );
}

/** Every second course of the crossing wall shows its end at the corner. */
function LogEnds({ height, courseM, xs, color }: { height: number; courseM: number; xs: number[]; color: string }) {
  const r = (courseM * per) / 2;
  const rows = Array.from({ length: Math.floor(height / courseM / 2) }, (_, i) => -(2 * i + 1.5) * courseM * per);
  return xs.flatMap((x) =>
    rows.map((y) => (
      <g key={`${x} ${y}`}>
        <circle cx={x} cy={y} r={r + 1.5} fill={color} stroke="rgb(0 0 0 / 55%)" strokeWidth="1.5" />
        <circle cx={x} cy={y} r={r * 0.5} fill="none" stroke="rgb(0 0 0 / 35%)" />
      </g>
    )),
  );
}

function Opening({ opening }: { opening: PlacedOpening }) {
  const [x, y, w, h] = [opening.x * per, -(opening.y + opening.heightM) * per, opening.widthM * per, opening.heightM * per];
  const trim = 4;
  return (
    <g>
      <rect x={x - trim} y={y - trim} width={w + 2 * trim} height={h + (opening.kind === 'door' ? trim : 2 * trim)} fill="var(--snow)" stroke="rgb(0 0 0 / 45%)" />
      <rect x={x} y={y} width={w} height={h} fill={opening.kind === 'door' ? 'var(--roof)' : 'var(--dose-1)'} />
      {opening.kind === 'window' ? <path d={`M${x + w / 2} ${y}v${h}M${x} ${y + h / 2}h${w}`} stroke="var(--snow)" strokeWidth="2.5" /> : null}
    </g>
  );
}

/** The edge of a porch roof or deck, and its shade on the wall at a sun of 45°. */
function CoverEdge({ w, h, cover }: { w: number; h: number; cover: WallCover }) {
  const width = Math.min(1, cover.share) * w;
  const underside = Math.min(cover.heightM * per, h);
  const x = (w - width) / 2;
  return (
    <>
      <rect x={x} y={-underside} width={width} height={Math.min(cover.depthM * per, underside)} fill="rgb(0 0 0 / 25%)" />
      <rect x={x - 6} y={-underside - 7} width={width + 12} height="8" fill="var(--eave)" />
    </>
  );
}

function Roof({ w, h, g, over, rise }: { w: number; h: number; g: number; over: number; rise: number }) {
  if (g > 0) {
    const slope = g / (w / 2);
    return <path d={`M${-over} ${-h + over * slope}L${w / 2} ${-h - g}L${w + over} ${-h + over * slope}`} fill="none" stroke="var(--eave)" strokeWidth="11" strokeLinejoin="miter" />;
  }
  return (
    <>
      <rect x="0" y={-h} width={w} height={Math.min(over, h / 4)} fill="rgb(0 0 0 / 25%)" />
      {rise > 0 ? <rect x={-over} y={-h - rise - 5} width={w + 2 * over} height={rise + 5} fill="var(--roofing)" /> : null}
      {Array.from({ length: Math.max(0, Math.floor(rise / 12) - 1) }, (_, i) => (
        <line key={i} x1={-over} x2={w + over} y1={-h - (i + 1.5) * 12} y2={-h - (i + 1.5) * 12} stroke="rgb(0 0 0 / 22%)" />
      ))}
      {rise > 0 ? <line x1={-over} x2={w + over} y1={-h - rise - 5} y2={-h - rise - 5} stroke="var(--eave)" strokeWidth="5" /> : null}
      <rect x={-over} y={-h - 9} width={w + 2 * over} height="11" fill="var(--eave)" />
    </>
  );
}
