import { lazy } from 'react';

/**
 * The screens behind the sign-in, fetched together the first time one of them is needed. Left to itself the bundler
 * moves every module that two routes share into what the sign-in page loads (510 kB gzipped instead of 393).
 */
const gather = () => import('./signed-in-screens');
export const TeamScreen = lazy(async () => ({ default: (await gather()).TeamScreen }));
export const ReportsScreen = lazy(async () => ({ default: (await gather()).ReportsScreen }));
export const RequestsScreen = lazy(async () => ({ default: (await gather()).RequestsScreen }));
export const AccountScreen = lazy(async () => ({ default: (await gather()).AccountScreen }));
export const FoodScreen = lazy(async () => ({ default: (await gather()).FoodScreen }));
export const FoodsScreen = lazy(async () => ({ default: (await gather()).FoodsScreen }));
export const NewFoodScreen = lazy(async () => ({ default: (await gather()).NewFoodScreen }));
export const AccountRedirect = lazy(async () => ({ default: (await gather()).AccountRedirect }));
export const MaterialScreen = lazy(async () => ({ default: (await gather()).MaterialScreen }));
export const MaterialsScreen = lazy(async () => ({ default: (await gather()).MaterialsScreen }));
export const NewMaterialScreen = lazy(async () => ({ default: (await gather()).NewMaterialScreen }));
export const MoreScreen = lazy(async () => ({ default: (await gather()).MoreScreen }));
export const PackScreen = lazy(async () => ({ default: (await gather()).PackScreen }));
export const PacksScreen = lazy(async () => ({ default: (await gather()).PacksScreen }));
export const NewPackScreen = lazy(async () => ({ default: (await gather()).NewPackScreen }));
export const RouteScreen = lazy(async () => ({ default: (await gather()).RouteScreen }));
export const RoutesScreen = lazy(async () => ({ default: (await gather()).RoutesScreen }));
export const NewRouteScreen = lazy(async () => ({ default: (await gather()).NewRouteScreen }));
export const EditStudyScreen = lazy(async () => ({ default: (await gather()).EditStudyScreen }));
export const StudyScreen = lazy(async () => ({ default: (await gather()).StudyScreen }));
export const StudiesListScreen = lazy(async () => ({ default: (await gather()).StudiesListScreen }));
export const NewStudyScreen = lazy(async () => ({ default: (await gather()).NewStudyScreen }));
export const WallScreen = lazy(async () => ({ default: (await gather()).WallScreen }));
export const WallsScreen = lazy(async () => ({ default: (await gather()).WallsScreen }));
export const NewWallScreen = lazy(async () => ({ default: (await gather()).NewWallScreen }));
export const GalleryScreen = lazy(async () => ({ default: (await gather()).GalleryScreen }));
