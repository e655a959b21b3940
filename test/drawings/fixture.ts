import type {
  AppraisedOption,
  Design,
  FormId,
  Foundation,
  MethodId,
  Obstacle,
  SectionCut,
  Shape,
  Site,
  Standing,
  Support,
  Unit,
} from '../../lib/model/index.ts';
import { profileFor, proposedProfile, roadLevelAt } from '../../lib/site/index.ts';

/**
 * An invented crossing, the River Wend at Low Ferry, with six options drawn up by hand so that drawings and charts can be
 * looked at without the pipeline. No figure in here was worked out and none is evidence of anything.
 */
const families: Partial<Record<FormId, AppraisedOption['family']>> = {
  'precast-i': 'girder',
  'composite-i': 'girder',
  'cantilever-box': 'box',
  truss: 'truss',
  'tied-arch': 'arch',
  'cable-stayed': 'cable-supported',
};

const groundX = [
  1226, 1234, 1240, 1250, 1260, 1268, 1276, 1282, 1291, 1300, 1310, 1318, 1325, 1332, 1340, 1349, 1360, 1372,
  1378, 1385, 1392, 1400, 1410, 1420, 1430, 1440, 1450, 1460, 1470, 1478, 1484,
];
const groundZ = [
  18.1, 16.6, 15.33, 12.9, 11.3, 11.2, 11.15, 10.43, 9.96, 9.68, 9.85, 9.6, 8.65, 6.3, 4.43, 3.7, 4.23, 5.37,
  7.2, 9.28, 9.8, 9.79, 9.68, 9.93, 10.19, 10.54, 11.45, 13.3, 15.1, 16.4, 17.2,
];

const road = {
  startLevelM: 20.45,
  endLevelM: 18.2,
  fixedEnd: 'start',
  mayRiseM: 1.5,
  maxGradient: 0.06,
  fillSideSlope: 2,
  designSpeedKmh: 'unknown',
  crestRadiusM: 'unknown',
  sagRadiusM: 'unknown',
  startTieIn: 'moves',
  endTieIn: 'moves',
  startApproachM: 'unknown',
  endApproachM: 'unknown',
  approachSides: 'slopes',
} as const;

export const site: Site = {
  startM: 1240,
  endM: 1470,
  lengthM: 230,
  groundX,
  groundZ,
  zones: [
    { fromM: 1266, toM: 1278, hard: true, kind: 'railway', name: 'Low Ferry branch' },
    { fromM: 1325, toM: 1385, hard: true, kind: 'river', name: 'River Wend' },
  ],
  soffitLimits: [
    { fromM: 1267.4, toM: 1276.6, levelM: 17.1, reason: '5.90 m over rail', kind: 'railway' },
    { fromM: 1345, toM: 1365, levelM: 11.7, reason: '4.50 m over ordinary water', kind: 'river' },
    { fromM: 1280, toM: 1440, levelM: 11.9, reason: 'flood 10.90 with 1.00 m of freeboard', kind: 'flood' },
  ],
  waters: [{ name: 'River Wend', fromM: 1325, toM: 1385, levelM: 7.2, floodLevelM: 10.9 }],
  groundStretches: [
    {
      fromM: 1226,
      toM: 1318,
      known: false,
      classes: [
        { ground: 'gravel', bearingLevelM: 1.4, odds: 0.7 },
        { ground: 'soft-clay', bearingLevelM: -1.6, odds: 0.3 },
      ],
    },
    {
      fromM: 1318,
      toM: 1484,
      known: false,
      classes: [
        { ground: 'rock', bearingLevelM: 0.4, odds: 0.55 },
        { ground: 'soft-clay', bearingLevelM: -2.6, odds: 0.3 },
        { ground: 'gravel', bearingLevelM: 2, odds: 0.15 },
      ],
    },
  ],
  road,
  roadCurves: { crestRadiusM: 3000, sagRadiusM: 2000 },
  deck: {
    widthM: 12.5,
    carriagewayM: 9,
    carriagewayOffsetM: -0.75,
    lanes: 2,
    footwayM: 2,
    surfacingM: 0.1,
    superimposedKNm: 42,
  },
  standard: 'lm1',
  planRadiusM: Infinity,
  skewDeg: 8,
  mainOpening: { fromM: 1325, toM: 1385, widthM: 60 },
};

export const obstacles: readonly Obstacle[] = [
  {
    kind: 'railway',
    name: 'Low Ferry branch',
    fromM: 1266,
    toM: 1278,
    supports: 'hard',
    pierPremium: 'unknown',
    clearance: { fromM: 1267.4, toM: 1276.6, datumLevelM: 11.2, headroomM: 5.9, confirmed: false },
  },
  {
    kind: 'river',
    name: 'River Wend',
    fromM: 1325,
    toM: 1385,
    supports: 'hard',
    pierPremium: 'unknown',
    clearance: { fromM: 1345, toM: 1365, datumLevelM: 7.2, headroomM: 4.5, confirmed: true },
  },
];

const groundAt = (x: number): number => {
  const i = Math.max(
    1,
    groundX.findIndex((at) => at >= x),
  );
  const [a = 0, b = 1, za = 0, zb = 0] = [groundX[i - 1], groundX[i], groundZ[i - 1], groundZ[i]];
  return za + ((zb - za) * (x - a)) / (b - a);
};

type XZ = readonly [number, number];
const polygon = (
  part: string,
  material: Shape['material'],
  points: readonly XZ[],
  holes?: readonly (readonly XZ[])[],
): Shape => ({
  part,
  material,
  kind: 'polygon',
  points,
  ...(holes === undefined ? {} : { holes }),
});
const stroke = (
  part: string,
  material: Shape['material'],
  points: readonly XZ[],
  thicknessM: number,
  faint = false,
): Shape => ({
  part,
  material,
  kind: 'line',
  points,
  thicknessM,
  faint,
});

interface Along {
  readonly xM: number[];
  readonly depthM: number[];
}

/** Depth along a haunched or level girder: parabolas over each span between the depths given. */
function depths(spans: readonly number[], midspan: number, support: number): Along {
  const xM: number[] = [];
  const depthM: number[] = [];
  let at = 0;
  spans.forEach((span, index) => {
    const first = index === 0;
    const last = index === spans.length - 1;
    for (let i = index === 0 ? 0 : 1; i <= 24; i += 1) {
      const u = i / 24;
      // Level over the outer part of an end span, then falling to the pier.
      const t =
        spans.length === 1
          ? 0
          : first
            ? Math.max(0, (u - 0.4) / 0.6)
            : last
              ? Math.max(0, (0.6 - u) / 0.6)
              : Math.abs(2 * u - 1);
      xM.push(at + u * span);
      depthM.push(midspan + (support - midspan) * t * t);
    }
    at += span;
  });
  return { xM, depthM };
}

const length = (spans: readonly number[]): number => spans.reduce((sum, span) => sum + span, 0);

function deckFace(
  spans: readonly number[],
  along: Along,
  slabM: number,
  material: Shape['material'],
  jointM: number,
): Shape[] {
  const end = length(spans);
  const low = along.xM.map((x, i): XZ => [x, -(along.depthM[i] ?? 0)]).reverse();
  const shapes = [
    polygon('web', material, [[0, -slabM], [end, -slabM], ...low]),
    polygon('slab', 'concrete', [
      [0, 0],
      [end, 0],
      [end, -slabM],
      [0, -slabM],
    ]),
  ];
  for (let x = jointM; x < end; x += jointM) {
    const depth = along.depthM[along.xM.findIndex((at) => at >= x)] ?? 0;
    shapes.push(
      stroke(
        'stiffener',
        material,
        [
          [x, -slabM],
          [x, -depth],
        ],
        0.02,
        true,
      ),
    );
  }
  return shapes;
}

function design(
  form: FormId,
  method: MethodId,
  spans: readonly number[],
  along: Along,
  elevation: readonly Shape[],
  sections: readonly SectionCut[],
): Design {
  const midspan = Math.min(...along.depthM);
  const support = Math.max(...along.depthM);
  const limitingCheck = {
    id: 'bending-pier',
    label: 'bending at the piers',
    demand: 97,
    capacity: 100,
    unit: 'MNm',
    utilisation: 0.97,
  };
  return {
    task: {
      form,
      spansM: spans,
      deck: site.deck,
      standard: 'lm1',
      planRadiusM: Infinity,
      method,
      depthM: midspan,
    },
    depthM: { support, midspan },
    depthAlong: along,
    elevation,
    sections,
    reactions: [],
    checks: [limitingCheck],
    limitingCheck,
    ownWeightShare: 0.41,
    lines: [],
    heaviestPiece: null,
    warnings: [],
    figures: {},
  };
}

const slab = (half: number, thick: number): Shape =>
  polygon('slab', 'concrete', [
    [-half, -0.02 * half],
    [0, 0],
    [half, -0.02 * half],
    [half, -thick],
    [-half, -thick],
  ]);

function girderSection(depth: number, at: string, xM: number, places: readonly number[]): SectionCut {
  return {
    at,
    xM,
    shapes: [
      slab(6.25, 0.25),
      ...places.flatMap((x) => [
        stroke(
          'web',
          'steel',
          [
            [x, -0.25],
            [x, -depth],
          ],
          0.016,
        ),
        stroke(
          'top flange',
          'steel',
          [
            [x - 0.3, -0.27],
            [x + 0.3, -0.27],
          ],
          0.035,
        ),
        stroke(
          'bottom flange',
          'steel',
          [
            [x - 0.45, -depth + 0.03],
            [x + 0.45, -depth + 0.03],
          ],
          0.06,
        ),
      ]),
      stroke(
        'cross-girder',
        'steel',
        [
          [places[0] ?? 0, -0.9],
          [places[places.length - 1] ?? 0, -0.9],
        ],
        0.02,
        true,
      ),
      stroke(
        'cross-girder',
        'steel',
        [
          [places[0] ?? 0, -1.5],
          [places[places.length - 1] ?? 0, -1.5],
        ],
        0.02,
        true,
      ),
    ],
  };
}

function composite(spans: readonly number[], midspan: number, support: number): Design {
  const along = depths(spans, midspan, support);
  return design('composite-i', 'crane', spans, along, deckFace(spans, along, 0.25, 'steel', 7.5), [
    girderSection(midspan, 'midspan', length(spans) / 2, [-3.4, 3.4]),
    girderSection(support, 'pier', spans[0] ?? 0, [-3.4, 3.4]),
  ]);
}

function precast(spans: readonly number[], depth: number): Design {
  const along = depths(spans, depth, depth);
  const beams = [-5, -2.5, 0, 2.5, 5];
  const beam = (x: number): Shape =>
    polygon('beam', 'concrete', [
      [x - 0.55, -0.22],
      [x + 0.55, -0.22],
      [x + 0.55, -0.34],
      [x + 0.12, -0.5],
      [x + 0.12, -depth + 0.5],
      [x + 0.35, -depth + 0.3],
      [x + 0.35, -depth],
      [x - 0.35, -depth],
      [x - 0.35, -depth + 0.3],
      [x - 0.12, -depth + 0.5],
      [x - 0.12, -0.5],
      [x - 0.55, -0.34],
    ]);
  return design('precast-i', 'crane', spans, along, deckFace(spans, along, 0.22, 'concrete', 21), [
    { at: 'midspan', xM: length(spans) / 2, shapes: [slab(6.25, 0.22), ...beams.map(beam)] },
  ]);
}

function cantileverBox(spans: readonly number[], midspan: number, support: number): Design {
  const along = depths(spans, midspan, support);
  const cut = (at: string, xM: number, depth: number, floor: number): SectionCut => ({
    at,
    xM,
    shapes: [
      polygon(
        'box',
        'concrete',
        [
          [-6.25, -0.1],
          [0, 0],
          [6.25, -0.1],
          [6.25, -0.35],
          [3.4, -0.6],
          [2.9, -depth],
          [-2.9, -depth],
          [-3.4, -0.6],
          [-6.25, -0.35],
        ],
        [
          [
            [-2.5, -0.55],
            [0, -0.28],
            [2.5, -0.55],
            [2.45, -depth + floor + 0.2],
            [2.2, -depth + floor],
            [-2.2, -depth + floor],
            [-2.45, -depth + floor + 0.2],
          ],
        ],
      ),
    ],
  });
  return design(
    'cantilever-box',
    'stay-cantilever',
    spans,
    along,
    deckFace(spans, along, 0.35, 'concrete', 5),
    [cut('midspan', length(spans) / 2, midspan, 0.3), cut('pier', spans[0] ?? 0, support, 0.9)],
  );
}

function truss(span: number, height: number): Design {
  const along: Along = { xM: [0, span], depthM: [1.35, 1.35] };
  const panels = 8;
  const p = span / panels;
  const shapes: Shape[] = [
    stroke(
      'bottom chord',
      'steel',
      [
        [0, -0.9],
        [span, -0.9],
      ],
      0.6,
    ),
    stroke(
      'top chord',
      'steel',
      [
        [p, height - 0.9],
        [span - p, height - 0.9],
      ],
      0.6,
    ),
    polygon('floor', 'concrete', [
      [0, 0],
      [span, 0],
      [span, -1.35],
      [0, -1.35],
    ]),
  ];
  for (let i = 0; i < panels; i += 1) {
    const up = i % 2 === 0;
    shapes.push(
      stroke(
        'diagonal',
        'steel',
        [
          [i * p, up ? -0.9 : height - 0.9],
          [(i + 1) * p, up ? height - 0.9 : -0.9],
        ],
        0.4,
      ),
    );
  }
  for (let i = 2; i < panels; i += 2)
    shapes.push(
      stroke(
        'post',
        'steel',
        [
          [i * p, -0.9],
          [i * p, height - 0.9],
        ],
        0.2,
      ),
    );
  const planes = 6.95;
  const cut: SectionCut = {
    at: 'midspan',
    xM: span / 2,
    shapes: [
      slab(6.25, 0.25),
      ...[-planes, planes].flatMap((x) => [
        polygon('chord', 'steel', [
          [x - 0.3, -0.6],
          [x + 0.3, -0.6],
          [x + 0.3, -1.2],
          [x - 0.3, -1.2],
        ]),
        polygon('chord', 'steel', [
          [x - 0.3, height - 0.6],
          [x + 0.3, height - 0.6],
          [x + 0.3, height - 1.2],
          [x - 0.3, height - 1.2],
        ]),
        stroke(
          'post',
          'steel',
          [
            [x, -0.6],
            [x, height - 1.2],
          ],
          0.3,
        ),
      ]),
      stroke(
        'floor beam',
        'steel',
        [
          [-planes, -1.1],
          [planes, -1.1],
        ],
        0.05,
      ),
      stroke(
        'portal',
        'steel',
        [
          [-planes, height - 0.9],
          [planes, height - 0.9],
        ],
        0.3,
      ),
    ],
  };
  return design('truss', 'launch', [span], along, shapes, [cut]);
}

function tiedArch(span: number, riseM: number): Design {
  const along: Along = { xM: [0, span], depthM: [1.35, 1.35] };
  const z = (x: number): number => 4 * riseM * (x / span) * (1 - x / span) - 0.6;
  const rib: XZ[] = [];
  for (let i = 0; i <= 28; i += 1) rib.push([(span * i) / 28, z((span * i) / 28)]);
  const shapes: Shape[] = [
    stroke('rib', 'steel', rib, 1),
    polygon('floor', 'concrete', [
      [0, 0],
      [span, 0],
      [span, -1.35],
      [0, -1.35],
    ]),
  ];
  for (let x = 5; x < span; x += 5)
    shapes.push(
      stroke(
        'hanger',
        'stay',
        [
          [x, -0.4],
          [x, z(x)],
        ],
        0.06,
      ),
    );
  const cut: SectionCut = {
    at: 'midspan',
    xM: span / 2,
    shapes: [
      slab(6.25, 0.25),
      ...[-6.95, 6.95].flatMap((x) => [
        polygon('tie', 'steel', [
          [x - 0.4, -0.1],
          [x + 0.4, -0.1],
          [x + 0.4, -1.35],
          [x - 0.4, -1.35],
        ]),
        polygon('rib', 'steel', [
          [x - 0.4, riseM - 0.1],
          [x + 0.4, riseM - 0.1],
          [x + 0.4, riseM - 1.1],
          [x - 0.4, riseM - 1.1],
        ]),
        stroke(
          'hanger',
          'stay',
          [
            [x, -0.1],
            [x, riseM - 1.1],
          ],
          0.06,
        ),
      ]),
      stroke(
        'floor beam',
        'steel',
        [
          [-6.95, -1.2],
          [6.95, -1.2],
        ],
        0.04,
      ),
    ],
  };
  return design('tied-arch', 'float-in', [span], along, shapes, [cut]);
}

function cableStayed(spans: readonly number[], pylonX: number, heightM: number): Design {
  const end = length(spans);
  const along: Along = { xM: [0, end], depthM: [1.6, 1.6] };
  const shapes: Shape[] = [
    polygon('deck', 'steel', [
      [0, 0],
      [end, 0],
      [end, -1.6],
      [0, -1.6],
    ]),
    polygon('pylon', 'concrete', [
      [pylonX - 1.6, -10],
      [pylonX + 1.6, -10],
      [pylonX + 1, heightM],
      [pylonX - 1, heightM],
    ]),
  ];
  for (let i = 0; i < 10; i += 1) {
    const top = heightM - 1.5 - i * 1.8;
    const reach = 1 - i * 0.09;
    shapes.push(
      stroke(
        'stay',
        'stay',
        [
          [pylonX, top],
          [pylonX - 100 * reach, 0],
        ],
        0.1,
      ),
      stroke(
        'stay',
        'stay',
        [
          [pylonX, top],
          [pylonX + (end - pylonX - 1) * reach, 0],
        ],
        0.1,
      ),
    );
  }
  const cut: SectionCut = {
    at: 'midspan',
    xM: 60,
    shapes: [
      slab(6.25, 0.25),
      ...[-6.6, 6.6].flatMap((x) => [
        polygon('edge girder', 'steel', [
          [x - 0.25, 0],
          [x + 0.25, 0],
          [x + 0.25, -1.6],
          [x - 0.25, -1.6],
        ]),
        stroke(
          'stay',
          'stay',
          [
            [x, 0],
            [x * 0.96, 4.5],
          ],
          0.1,
        ),
      ]),
      stroke(
        'floor beam',
        'steel',
        [
          [-6.6, -1.2],
          [6.6, -1.2],
        ],
        0.04,
      ),
    ],
  };
  return design('cable-stayed', 'stay-cantilever', spans, along, shapes, [cut]);
}

function foundation(
  kind: 'abutment' | 'pier' | 'pylon',
  ground: string,
  odds: number,
  bearing: number,
  topLevelM: number,
): Foundation {
  const big = kind === 'pylon';
  const lengthM = kind === 'abutment' ? 4.2 : big ? 12.6 : 6.4;
  return {
    ground,
    odds,
    bearingLevelM: bearing,
    kind: 'bored-piles',
    footing: { lengthM, widthM: big ? 18 : 11, depthM: big ? 2.8 : 2, topLevelM },
    piles: {
      count: big ? 20 : 6,
      diameterM: big ? 1.5 : 1.2,
      lengthM: topLevelM - 2 - (bearing - 4.3),
      toeLevelM: bearing - 4.3,
    },
    lines: [],
  };
}

function supports(
  units: readonly Unit[],
  designs: readonly Design[],
  riseM: number,
  pylonAt?: number,
): Support[] {
  const all = [...new Set(units.flatMap((unit) => unit.supportsM))].sort((a, b) => a - b);
  return all.map((chainageM, index): Support => {
    const end = index === 0 || index === all.length - 1;
    const kind = end ? 'abutment' : chainageM === pylonAt ? 'pylon' : 'pier';
    const unit = Math.max(
      0,
      units.findIndex((one) => chainageM <= (one.supportsM[one.supportsM.length - 1] ?? 0)),
    );
    const here = designs[unit];
    const x = chainageM - (units[unit]?.supportsM[0] ?? 0);
    const depth =
      here === undefined
        ? 2
        : (here.depthAlong.depthM[here.depthAlong.xM.findIndex((at) => at >= x - 1e-6)] ?? 2);
    const level = 20.45 + riseM + ((18.2 - 20.45) * (chainageM - 1240)) / 230;
    const ground = groundAt(chainageM);
    const topLevelM = level - 0.1 - depth - 0.25;
    const stretch = chainageM < 1318 ? 0 : 1;
    const foot = end ? Math.min(ground, topLevelM) - 1.4 : ground - 1;
    return {
      chainageM,
      stretch,
      kind,
      groundLevelM: ground,
      topLevelM,
      heightM: topLevelM - ground,
      waterDepthM: 0,
      permanentKN: 9000,
      trafficKN: 3200,
      articulation: {
        fixed: index === 1,
        bearings: 2,
        bearingMN: 8,
        alongKN: 400,
        acrossKN: 300,
        jointMovementMm: end ? 60 : 0,
        tieDownKN: 0,
      },
      lines: [],
      shaft: {
        lengthM: end ? 1.4 : kind === 'pylon' ? 3 : 1.8,
        widthM: 8,
        columns: 1,
        concreteM3: 60,
        reinforcementKg: 9000,
      },
      foundations: (site.groundStretches[stretch]?.classes ?? []).map(
        ({ ground: name, odds, bearingLevelM }) =>
          foundation(
            end ? 'abutment' : kind === 'pylon' ? 'pylon' : 'pier',
            name,
            odds,
            bearingLevelM!,
            foot,
          ),
      ),
    };
  });
}

interface Row {
  readonly number: number;
  readonly form: FormId;
  readonly method: MethodId;
  readonly units: readonly Unit[];
  readonly designs: readonly Design[];
  readonly rise?: number;
  readonly pylonAt?: number;
  readonly cost: readonly [number, number, number, number, number];
  readonly perM2: number;
  readonly per: {
    readonly concrete: number;
    readonly steel: number;
    readonly bars: number;
    readonly strand: number;
    readonly stays: number;
  };
  readonly parts: readonly number[];
  readonly months: readonly [number, number, number];
  readonly status: AppraisedOption['status'];
}

const partNames = [
  'deck',
  'bearings-joints',
  'piers',
  'foundations',
  'abutments',
  'approaches',
  'river-works',
  'temporary-works',
  'preliminaries',
] as const;

function option(row: Row): AppraisedOption {
  const area = 230 * 12.5;
  const { concrete, steel, bars, strand, stays } = row.per;
  const perM2 = {
    concreteM3: concrete,
    reinforcementKg: bars,
    prestressKg: strand,
    structuralSteelKg: steel,
    stayCableKg: stays,
    mainCableKg: 0,
  };
  const [p10, q1, p50, q3, p90] = row.cost.map((value) => value * 1e6) as [
    number,
    number,
    number,
    number,
    number,
  ];
  const main = row.designs[row.units.findIndex((unit) => unit.role === 'main')];
  const riseM = row.rise ?? 0;
  return {
    number: row.number,
    form: row.form,
    family: families[row.form] ?? 'girder',
    method: row.method,
    units: row.units,
    designs: row.designs,
    depthM: main?.depthM ?? { support: 0, midspan: 0 },
    profile: {
      ...proposedProfile({
        ...site,
        road: { ...road, startLevelM: road.startLevelM + riseM, endLevelM: road.endLevelM + riseM },
      }),
      startRiseM: riseM,
      endRiseM: riseM,
    },
    supports: supports(row.units, row.designs, riseM, row.pylonAt),
    lines: [],
    months: { p10: row.months[0], p50: row.months[1], p90: row.months[2] },
    status: row.status,
    faults: [],
    rulings: [],
    quantities: perM2,
    perM2,
    supportQuantities: {
      concreteM3: 0.4,
      reinforcementKg: 52,
      prestressKg: 0,
      structuralSteelKg: 0,
      stayCableKg: 0,
      mainCableKg: 0,
    },
    hundredMm: { fillM3: 90, cutM3: 0, wallM2: 0, surfacingM2: 0, parapetM: 0, amount: 1530 },
    headroom: { spareM: 0.5, reason: '5.90 m over rail', chainageM: 1276.6 },
    deckAreaM2: area,
    cost: { p10, p50, p90 },
    quartiles: [q1, q3],
    pricePerM2: { withApproaches: row.perM2, withoutApproaches: row.perM2 * 0.93 },
    parts: partNames.map((part, index) => ({ part, p50: (row.parts[index] ?? 0) * 1e6 })),
    limitingCheck: { id: 'bending-pier', label: 'bending at the piers', utilisation: 0.97 },
  };
}

const along = (form: FormId, role: Unit['role'], from: number, spans: readonly number[]): Unit => {
  const supportsM = [from];
  for (const span of spans) supportsM.push((supportsM[supportsM.length - 1] ?? from) + span);
  return { form, role, supportsM };
};

export const options: readonly AppraisedOption[] = [
  option({
    number: 1,
    form: 'precast-i',
    method: 'crane',
    status: 'possible',
    units: [along('precast-i', 'main', 1240, [42, 41.5, 63, 41.5, 42])],
    designs: [precast([42, 41.5, 63, 41.5, 42], 2.75)],
    cost: [8.2, 9.1, 9.9, 10.9, 12],
    perM2: 3400,
    per: { concrete: 0.53, steel: 0, bars: 84, strand: 29, stays: 0 },
    parts: [3.5, 0.3, 0.8, 1.9, 0.6, 0.7, 0.3, 0.4, 1.4],
    months: [17, 20, 24],
  }),
  option({
    number: 2,
    form: 'composite-i',
    method: 'launch',
    status: 'in',
    units: [along('composite-i', 'main', 1240, [70, 90, 70])],
    designs: [composite([70, 90, 70], 2.3, 3.6)],
    cost: [8, 8.8, 9.7, 10.7, 11.8],
    perM2: 3400,
    per: { concrete: 0.28, steel: 216, bars: 64, strand: 0, stays: 0 },
    parts: [4, 0.3, 0.4, 1.1, 0.6, 0.7, 0.3, 0.7, 1.4],
    months: [14, 17, 21],
  }),
  option({
    number: 3,
    form: 'cantilever-box',
    method: 'stay-cantilever',
    status: 'possible',
    rise: 0.2,
    units: [along('cantilever-box', 'main', 1240, [65, 100, 65])],
    designs: [cantileverBox([65, 100, 65], 2.8, 5.6)],
    cost: [8.9, 9.9, 11, 12.3, 13.6],
    perM2: 3800,
    per: { concrete: 0.77, steel: 0, bars: 112, strand: 33, stays: 0 },
    parts: [4.6, 0.2, 0.7, 1.4, 0.6, 0.8, 0.1, 0.9, 1.6],
    months: [20, 24, 29],
  }),
  option({
    number: 4,
    form: 'truss',
    method: 'launch',
    status: 'possible',
    rise: -0.8,
    units: [
      along('composite-i', 'approach', 1240, [41, 41]),
      along('truss', 'main', 1322, [66]),
      along('composite-i', 'approach', 1388, [41, 41]),
    ],
    designs: [composite([41, 41], 1.7, 1.7), truss(66, 8), composite([41, 41], 1.7, 1.7)],
    cost: [9.2, 10.3, 11.7, 13.1, 14.6],
    perM2: 4000,
    per: { concrete: 0.29, steel: 186, bars: 66, strand: 0, stays: 0 },
    parts: [5.1, 0.3, 0.7, 1.8, 0.6, 0.5, 0.3, 0.7, 1.6],
    months: [16, 19, 24],
  }),
  option({
    number: 5,
    form: 'cable-stayed',
    method: 'stay-cantilever',
    status: 'out',
    rise: -1.1,
    pylonAt: 1387,
    units: [along('cable-stayed', 'main', 1240, [42, 105, 50, 33])],
    designs: [cableStayed([42, 105, 50, 33], 147, 40)],
    cost: [12.6, 14.3, 16.4, 18.9, 21.4],
    perM2: 5700,
    per: { concrete: 0.29, steel: 205, bars: 71, strand: 0, stays: 17 },
    parts: [8.1, 0.4, 1.6, 1.9, 0.6, 0.4, 0.2, 0.9, 2.3],
    months: [23, 28, 36],
  }),
  option({
    number: 6,
    form: 'tied-arch',
    method: 'float-in',
    status: 'possible',
    rise: -0.8,
    units: [
      along('composite-i', 'approach', 1240, [42, 38]),
      along('tied-arch', 'main', 1320, [70]),
      along('composite-i', 'approach', 1390, [38, 42]),
    ],
    designs: [composite([42, 38], 1.7, 1.7), tiedArch(70, 12), composite([38, 42], 1.7, 1.7)],
    cost: [9.5, 10.6, 11.9, 13.4, 14.9],
    perM2: 4100,
    per: { concrete: 0.3, steel: 198, bars: 68, strand: 0, stays: 5 },
    parts: [5.3, 0.4, 0.7, 1.9, 0.6, 0.4, 0.3, 0.7, 1.6],
    months: [17, 20, 25],
  }),
];

export const budget: number = 11.5e6;

export const standing: Standing = {
  leader: 2,
  groups: [[2, 1], [3, 4, 6], [5]],
  odds: {
    2: { 1: 0.6, 3: 0.85, 4: 0.9, 6: 0.95, 5: 0.99 },
    1: { 2: 0.4, 3: 0.8, 4: 0.9, 6: 0.9, 5: 0.99 },
    3: { 2: 0.15, 1: 0.2, 4: 0.65, 6: 0.7, 5: 0.98 },
    4: { 2: 0.1, 1: 0.1, 3: 0.35, 6: 0.55, 5: 0.95 },
    6: { 2: 0.05, 1: 0.1, 3: 0.3, 4: 0.45, 5: 0.95 },
    5: { 2: 0.01, 1: 0.01, 3: 0.02, 4: 0.05, 6: 0.05 },
  },
  within: { 1: 0.85, 2: 0.9, 3: 0.6, 4: 0.5, 5: 0.05, 6: 0.4 },
  because: ['2 leads: cheapest at the median'],
};

/** The same crossing with its road a metre lower at both ends, so that the railway asks for a crest. */
export const lowSite: Site = {
  ...site,
  road: { ...road, startLevelM: 19.2, endLevelM: 17.2, fixedEnd: 'none', mayRiseM: 3 },
  roadCurves: { crestRadiusM: 1700, sagRadiusM: 1300 },
};

/** An option on the road that the low crossing needs for it, its supports moved along. */
export function crested(drawn: AppraisedOption): AppraisedOption {
  const found = profileFor(lowSite, drawn.depthM.support + 0.2);
  if (!found.ok) throw new Error('expected a road over the railway');
  const { profile } = found;
  const supports = drawn.supports.map((support) => ({
    ...support,
    topLevelM:
      support.topLevelM +
      roadLevelAt(profile, support.chainageM) -
      roadLevelAt(drawn.profile, support.chainageM),
  }));
  return { ...drawn, profile, supports };
}
