import { scaleLinear } from 'd3-scale';
import { memo } from 'react';
import type { Plot } from '@/lib/scene/bench-model';
import { shortNumber } from '@/lib/scene/measure';

const [width, height] = [360, 260];
const inside = { left: 46, right: 350, top: 12, bottom: 214 };

interface BenchPlotProps {
  readonly plot: Plot;
  readonly drive: number;
}

/** Output against drive, with a dot on each line where the drive stands. */
export function BenchPlot({ plot, drive }: BenchPlotProps) {
  const { x, y } = scalesOf(plot);
  const now = plot.now(drive);
  return (
    <figure className="m-0">
      <figcaption className="pb-1 text-[0.9375rem] font-semibold">{plot.title}</figcaption>
      <svg viewBox={`0 0 ${width} ${height}`} role="img" aria-label={plot.title} className="w-full">
        <Still plot={plot} />
        {plot.lines.map((line, index) => (
          <Dot key={line.label} x={x} y={y} at={now[index]} role={line.role} />
        ))}
      </svg>
      <ul className="flex flex-wrap gap-x-5 text-[0.9375rem]">
        {plot.lines.map((line) => (
          <li key={line.label} className="flex items-center gap-2">
            <svg width="28" height="8" aria-hidden="true">
              <path
                d="M0 4H28"
                strokeWidth={2}
                strokeDasharray={line.dashed ? '5 4' : undefined}
                style={{ stroke: `var(--${line.role})` }}
              />
            </svg>
            {line.label}
          </li>
        ))}
      </ul>
    </figure>
  );
}

function scalesOf({ across, up }: Plot) {
  return {
    x: scaleLinear([across.least, across.most], [inside.left, inside.right]),
    y: scaleLinear([up.least, up.most], [inside.bottom, inside.top]),
  };
}

/** Axes and lines: what stays as it is while the mechanism moves. */
const Still = memo(function Still({ plot }: Pick<BenchPlotProps, 'plot'>) {
  const { x, y } = scalesOf(plot);
  const path = (points: Plot['lines'][number]['points']) =>
    `M${points.map((point) => `${brief(x(point.x))} ${brief(y(point.y))}`).join('L')}`;
  return (
    <>
      <g className="stroke-rule">
        {plot.across.ticks.map((tick) => (
          <path key={`x${tick}`} d={`M${brief(x(tick))} ${inside.top}V${inside.bottom}`} />
        ))}
        {plot.up.ticks.map((tick) => (
          <path key={`y${tick}`} d={`M${inside.left} ${brief(y(tick))}H${inside.right}`} />
        ))}
      </g>
      <path
        className="fill-none stroke-pencil"
        d={`M${inside.left} ${inside.top}V${inside.bottom}H${inside.right}`}
      />
      <g className="fill-pencil font-mono text-[12px]">
        {plot.across.ticks.map((tick) => (
          <text key={tick} x={brief(x(tick))} y={inside.bottom + 16} textAnchor="middle">
            {shortNumber(tick, 2)}
          </text>
        ))}
        {plot.up.ticks.map((tick) => (
          <text key={tick} x={inside.left - 6} y={brief(y(tick))} dy="0.35em" textAnchor="end">
            {shortNumber(tick, 2)}
          </text>
        ))}
      </g>
      <text
        className="fill-pencil text-[13px]"
        x={(inside.left + inside.right) / 2}
        y={inside.bottom + 36}
        textAnchor="middle"
      >
        across: {plot.across.label}; up: {plot.up.label}
      </text>
      {plot.lines.map((line) => (
        <path
          key={line.label}
          d={path(line.points)}
          fill="none"
          strokeWidth={2}
          strokeDasharray={line.dashed ? '5 4' : undefined}
          style={{ stroke: `var(--${line.role})` }}
        />
      ))}
    </>
  );
});

/** To a tenth of a pixel: servers and browsers may differ in the last digits of a sine. */
function brief(value: number): number {
  return Math.round(value * 10) / 10;
}

interface DotProps {
  readonly x: (value: number) => number;
  readonly y: (value: number) => number;
  readonly at: { readonly x: number; readonly y: number } | undefined;
  readonly role: string;
}

function Dot({ x, y, at, role }: DotProps) {
  if (!at) return null;
  const [cx, cy] = [brief(x(at.x)), brief(y(at.y))];
  const inFrame =
    cx >= inside.left && cx <= inside.right && cy >= inside.top && cy <= inside.bottom;
  return inFrame ? <circle cx={cx} cy={cy} r={4} style={{ fill: `var(--${role})` }} /> : null;
}
