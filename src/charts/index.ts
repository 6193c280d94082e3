export { ChartWithTable, type ChartWithTableProps } from './chart-with-table';
export { DaysRuler, type DaysRulerEntry, type DaysRulerProps } from './days-ruler';
export { HatchSwatch, MiniSection, type MiniSectionProps } from './mini-section';
export { MiniRuler, type MiniRulerProps } from './mini-ruler';
export { PressureStairs, type PressureStairsProps, type StairSeries } from './pressure-stairs';
export { SectionDrawing, type SectionDrawingProps } from './section-drawing';
export { type DrawnLayer } from './section-geometry';
export { ShareBars, type ShareBarsProps, type ShareRow } from './share-bars';
export { TimeCourse, type TimeCourseProps } from './time-course';
