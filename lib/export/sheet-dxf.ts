import {
  DxfWriter,
  LWPolylineFlags,
  point2d,
  point3d,
  TextHorizontalAlignment,
  Units,
} from '@tarikjabiri/dxf';
import type { SheetView } from '@/lib/contracts/rooms';
import { elevationTitle, wallsWithRuns } from './sheet-drawings';
import { supersededWords } from './sheet-stamp';
import { trueElevation } from './true-elevation';
import { truePlan } from './true-plan';
import {
  extentOf,
  shifted,
  type TrueLayer,
  type TrueShape,
  trueLayers,
  trueWords,
} from './true-shape';

const betweenMm = 900;

type LayerLook = { colour: number; line: 'Continuous' | 'Dashed' | 'Dash dot' };
/** Colours by the AutoCAD index: 1 red, 3 green, 5 blue, 7 black on white, 8 grey. */
const looks: Record<TrueLayer, LayerLook> = {
  Walls: { colour: 7, line: 'Continuous' },
  'Wall faces as read': { colour: 1, line: 'Continuous' },
  'Windows and doors': { colour: 5, line: 'Continuous' },
  Services: { colour: 5, line: 'Continuous' },
  Studs: { colour: 5, line: 'Dash dot' },
  'Studs predicted': { colour: 8, line: 'Dash dot' },
  'Floor as read': { colour: 3, line: 'Continuous' },
  'Ceiling as read': { colour: 3, line: 'Continuous' },
  Units: { colour: 7, line: 'Continuous' },
  'Units above': { colour: 8, line: 'Dashed' },
  Fronts: { colour: 8, line: 'Continuous' },
  Fillers: { colour: 1, line: 'Continuous' },
  Counters: { colour: 8, line: 'Continuous' },
  Kicks: { colour: 8, line: 'Continuous' },
  Words: { colour: 7, line: 'Continuous' },
  Revision: { colour: 1, line: 'Continuous' },
};

/**
 * A released sheet as DXF at true size in millimetres, nothing drawn larger than it is: the plan, and under
 * it the elevation of each wall that carries runs, on layers named in plain words.
 *
 * Edge: DXF of AutoCAD 2007 (AC1021), the oldest that holds names in any alphabet; lines and polylines only,
 * so that a saw or router can read it too.
 * Source: DXF Reference, AutoCAD 2007 ($INSUNITS 4 is millimetres).
 */
export function sheetDxf(sheet: SheetView): string {
  const writer = new DxfWriter();
  writer.setUnits(Units.Millimeters);
  writer.setVariable('$MEASUREMENT', { 70: 1 });
  writer.setVariable('$LASTSAVEDBY', { 1: 'Setwell' });
  writer.addLType('Dashed', '__ __ __', [60, -30]);
  writer.addLType('Dash dot', '__ . __ .', [120, -40, 10, -40]);
  for (const layer of trueLayers) {
    const { colour, line } = looks[layer];
    writer.addLayer(layer, colour, line);
  }
  for (const shape of laidOut(sheet)) add(writer, shape);
  return writer.stringify();
}

/** The plan with its heading, and the elevations one under another. */
function laidOut(sheet: SheetView): TrueShape[] {
  const plan = truePlan(sheet);
  const { left, top, bottom } = extentOf(plan);
  const placed = [...plan, ...heading(sheet, left, top + 500)];
  let below = bottom - betweenMm;
  for (const { wall, runs } of wallsWithRuns(sheet)) {
    const shapes = trueElevation(sheet, { wall, runs });
    const extent = extentOf(shapes);
    const title = trueWords([0, extent.top + 200], elevationTitle(wall, runs), { heightMm: 90 });
    placed.push(...shifted([...shapes, title], [0, below - extent.top - 300]));
    below -= extent.top - extent.bottom + 300 + betweenMm;
  }
  return placed;
}

function heading(sheet: SheetView, left: number, bottom: number): TrueShape[] {
  const { jobNumber, roomName, release, shopName, jobTitle } = sheet;
  const stamp = supersededWords(sheet);
  const lines = [
    `${jobNumber} ${roomName}, revision ${release.revision}`,
    `${shopName}, ${jobTitle}. Released ${release.releasedAtWords} by ${release.releasedBy}`,
    'Millimetres, true size; nothing is drawn larger than it is. Figures govern.',
    ...(stamp ? [stamp.toUpperCase()] : []),
  ];
  return lines.map((words, index) =>
    trueWords([left, bottom + (lines.length - index) * 130], words, {
      heightMm: index === 0 ? 110 : 70,
    }),
  );
}

function add(writer: DxfWriter, shape: TrueShape): void {
  const layerName = shape.layer;
  if (shape.kind === 'text') {
    const at = point3d(tidy(shape.at[0]), tidy(shape.at[1]));
    const centred = {
      horizontalAlignment: TextHorizontalAlignment.Center,
      secondAlignmentPoint: at,
    };
    writer.addText(at, shape.heightMm, dxfWords(shape.words), {
      layerName,
      ...(shape.anchor === 'middle' ? centred : {}),
    });
    return;
  }
  const [from, to] = shape.points;
  if (shape.kind === 'line' && shape.points.length === 2 && from && to) {
    writer.addLine(point3d(tidy(from[0]), tidy(from[1])), point3d(tidy(to[0]), tidy(to[1])), {
      layerName,
    });
    return;
  }
  const flags = shape.kind === 'outline' ? LWPolylineFlags.Closed : LWPolylineFlags.None;
  const vertices = shape.points.map(([x, y]) => ({ point: point2d(tidy(x), tidy(y)) }));
  writer.addLWPolyline(vertices, { layerName, flags });
}

/** No 1e-7, which some readers do not take, and no minus nought. */
const tidy = (mm: number) => Math.round(mm * 10_000) / 10_000 || 0;

/** A text is one line of the file; "%%" and "^" begin codes. */
function dxfWords(words: string): string {
  return words
    .replace(/[\p{Cc}\u2028\u2029]+/gu, ' ')
    .replace(/%%+/g, '%')
    .replaceAll('^', '^ ');
}
