'use client';

import { useMemo } from 'react';
import type { WallBook } from '@/lib/contracts/wall-book';
import type { PlanCorner, PlanWall, RoomPlan } from '@/lib/walls-pad/room-plan';
import { roomPlan } from '@/lib/walls-pad/room-plan';
import { type LengthSpeech, sayLength } from '@/lib/walls-pad/say-length';
import type { PlanPoint } from '@/lib/walls-pad/walk';
import { FRAME, insideCorner, type Place, planFrame, wallInFrame } from './plan-frame';

type PlanPictureProps = {
  book: WallBook;
  speech: LengthSpeech;
  /** Walls that the question is about. */
  currentWallIds: string[];
  /** Corner that the question is about. */
  currentCornerId?: string | null;
  /** A diagonal or a width that is being asked for. */
  across?: { fromId: string; toId: string; isWidth: boolean } | null;
  hrefOfWall: (wallId: string) => string;
  /** While it is drawn, the rough lengths stand by the walls. */
  isSketch?: boolean;
};

/** The room from above, small: what was read stands by its wall; touch a wall to go to its readings. */
export function PlanPicture(props: PlanPictureProps) {
  const { book, currentWallIds, hrefOfWall } = props;
  const plan = useMemo(() => roomPlan(book), [book]);
  const place = planFrame(plan);
  return (
    <nav aria-label="Plan of the room">
      <svg
        viewBox={`0 0 ${FRAME.width} ${FRAME.height}`}
        preserveAspectRatio="xMidYMid meet"
        className="absolute inset-0 size-full font-sans"
      >
        <title>Plan of the room</title>
        <path d={floorPath(plan, place)} className="fill-paper" />
        <Across {...props} plan={plan} place={place} />
        {plan.walls.map((wall) => (
          <WallLine
            key={wall.wallId}
            wall={wall}
            place={place}
            speech={props.speech}
            isCurrent={currentWallIds.includes(wall.wallId)}
            href={hrefOfWall(wall.wallId)}
            isSketch={props.isSketch ?? false}
          />
        ))}
        {plan.corners.map((corner) => (
          <CornerMark
            key={corner.cornerWallId}
            corner={corner}
            walls={plan.walls}
            place={place}
            isCurrent={corner.cornerWallId === props.currentCornerId}
          />
        ))}
      </svg>
    </nav>
  );
}

/** The floor inside the chains that close. */
function floorPath(plan: RoomPlan, place: (point: PlanPoint) => Place): string {
  return plan.outlines
    .filter(({ closed }) => closed)
    .flatMap(({ points }) => points.map((point, at) => `${at ? 'L' : 'M'}${xy(place(point))}`))
    .join('');
}

type InFrame = { place: (point: PlanPoint) => Place };

function WallLine({
  wall,
  place,
  speech,
  isCurrent,
  href,
  isSketch,
}: InFrame & {
  wall: PlanWall;
  speech: LengthSpeech;
  isCurrent: boolean;
  href: string;
  isSketch: boolean;
}) {
  const { from, to, length, out, middle } = wallInFrame(wall, place);
  const lengthMm = wall.readMm ?? (isSketch ? wall.drawnMm : null);
  const isRead = lengthMm !== null;
  const label = { x: middle.x + out.x * 13, y: middle.y + out.y * 13 + 4 };
  const read = lengthMm === null ? '' : sayLength(lengthMm, speech).replace(/ mm$|"$/g, '');
  const hasRoom = Math.abs(out.y) > 0.7 ? length > 70 : true;
  const anchor = out.x > 0.7 ? 'start' : out.x < -0.7 ? 'end' : 'middle';
  const words = `Wall ${wall.name}${isRead ? `, ${read}` : ', not read'}`;
  return (
    <a href={href} aria-label={words} className="outline-offset-0">
      <path d={`M${xy(from)}L${xy(to)}`} className="stroke-transparent" strokeWidth={30} />
      <path
        d={`M${xy(from)}L${xy(to)}`}
        strokeWidth={isCurrent ? 7 : 2.2}
        strokeDasharray={isRead || isCurrent ? undefined : '5 3'}
        className={isCurrent ? 'stroke-pine' : isRead ? 'stroke-ink' : 'stroke-graphite'}
      />
      <text
        x={out.x ? label.x - out.x * 5 : label.x}
        y={label.y}
        textAnchor={anchor}
        className={`text-[12px] ${isCurrent ? 'fill-pine font-bold' : 'fill-graphite'}`}
      >
        <tspan className="font-bold">{wall.name}</tspan>
        {isRead && hasRoom ? <PlanLength text={read} /> : null}
      </text>
    </a>
  );
}

/** A length on the plan, its fraction set as one. */
function PlanLength({ text }: { text: string }) {
  const [, whole = '', fraction = ''] = /^(\d*)(?: ?(\d+\/\d+))?$/.exec(text) ?? ['', text];
  return (
    <>
      <tspan dx="3">{whole}</tspan>
      {fraction ? (
        <tspan dx="2" className="diagonal-fractions">
          {fraction.replace('/', '⁄')}
        </tspan>
      ) : null}
    </>
  );
}

function CornerMark({
  corner,
  walls,
  place,
  isCurrent,
}: InFrame & { corner: PlanCorner; walls: PlanWall[]; isCurrent: boolean }) {
  const at = place(corner.at);
  const label = insideCorner(corner, walls, place, 27);
  return (
    <g>
      {isCurrent ? (
        <circle cx={at.x} cy={at.y} r={9} strokeWidth={3} className="fill-none stroke-pine" />
      ) : null}
      {corner.readDeg === null ? null : (
        <text
          x={label.x}
          y={label.y + 4}
          textAnchor="middle"
          className="fill-graphite text-[11px] font-medium"
        >
          {corner.readDeg.toFixed(1)}°
        </text>
      )}
    </g>
  );
}

/** Where the tape or the laser goes across the room. */
function Across({ plan, place, across }: PlanPictureProps & InFrame & { plan: RoomPlan }) {
  if (!across) return null;
  const ends = [across.fromId, across.toId].map((id) => {
    const wall = plan.walls.find(({ wallId }) => wallId === id);
    if (!wall) return null;
    return across.isWidth ? wallInFrame(wall, place).middle : place(wall.from);
  });
  const [from, to] = ends;
  if (!from || !to) return null;
  return (
    <path
      d={`M${xy(from)}L${xy(to)}`}
      strokeWidth={2.5}
      strokeDasharray="6 4"
      className="stroke-blueprint"
    />
  );
}

function xy({ x, y }: Place): string {
  return `${x.toFixed(1)} ${y.toFixed(1)}`;
}
