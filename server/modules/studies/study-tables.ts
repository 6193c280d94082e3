import {
  foodRevisions,
  foods,
  laminateRevisions,
  laminates,
  materialRevisions,
  materials,
  packRevisions,
  packs,
  routeRevisions,
  routes,
  studies,
  studyRevisions,
} from '../../db/schema';

/** A study and everything that it may use. */
export const TABLES = {
  materials: { things: materials, revisions: materialRevisions },
  laminates: { things: laminates, revisions: laminateRevisions },
  packs: { things: packs, revisions: packRevisions },
  foods: { things: foods, revisions: foodRevisions },
  routes: { things: routes, revisions: routeRevisions },
  studies: { things: studies, revisions: studyRevisions },
} as const;
