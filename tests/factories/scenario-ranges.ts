/** Least and greatest of every quantity that a scenario is drawn from. */
export type ScenarioRanges = Record<keyof typeof LIKELY, readonly [low: number, high: number]>;

/** What a consultancy may meet in a coastal sea. */
export const LIKELY = {
  waterDepth: [5, 300],
  layerDepth: [1, 150],
  levelStep: [0.5, 40],
  temperature: [-1, 32],
  salinity: [0, 41],
  interval: [60, 21_600],
  windSpeed: [0, 70],
  windHeight: [2, 60],
  rain: [0, 100],
  evaporation: [-0.1, 2],
  flux: [-800, 800],
  dragCoefficient: [5e-4, 4e-3],
  timeStep: [450, 3600],
  dampingRate: [0, 1e-4],
  eddyViscosity: [1e-3, 1],
  bottomDrag: [0, 0.01],
  cellSize: [2, 4],
  maxDepth: [50, 200],
} as const;

/** All that is valid, however unlikely; but for large cells, of which there are few, so that no case takes long. */
export const LIMITS: ScenarioRanges = {
  waterDepth: [0.001, 12_000],
  layerDepth: [0.001, 12_000],
  levelStep: [1e-6, 1000],
  temperature: [-4, 45],
  salinity: [0, 59.7],
  interval: [1e-3, 21_600],
  windSpeed: [0, 150],
  windHeight: [0.1, 200],
  rain: [0, 100_000],
  evaporation: [-100, 1000],
  flux: [-5000, 5000],
  dragCoefficient: [1e-5, 0.02],
  timeStep: [450, 21_600],
  dampingRate: [0, 0.01],
  eddyViscosity: [1e-6, 10],
  bottomDrag: [0, 0.1],
  cellSize: [5, 50],
  maxDepth: [1, 200],
};
