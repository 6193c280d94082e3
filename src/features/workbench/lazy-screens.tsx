import { lazy, Suspense } from 'react';
import { LoadingState } from '../../ui';

/**
 * The screens behind the sign-in, fetched together the first time one of them is needed. Left to itself the bundler
 * moves every module that two routes share into what the sign-in page loads (510 kB gzipped instead of 393).
 */
const gather = () => import('./signed-in-screens');

type ScreenName = keyof Awaited<ReturnType<typeof gather>>;

/** A plain component round the lazy one: the router makes routes lazy itself, and React refuses lazy within lazy. */
function fetched(name: ScreenName) {
  const Fetched = lazy(async () => ({ default: (await gather())[name] }));
  return function FetchedScreen() {
    return (
      <Suspense fallback={<LoadingState what="Fetching the page" />}>
        <Fetched />
      </Suspense>
    );
  };
}

export const TeamScreen = fetched('TeamScreen');
export const ReportsScreen = fetched('ReportsScreen');
export const RequestsScreen = fetched('RequestsScreen');
export const AccountScreen = fetched('AccountScreen');
export const FoodScreen = fetched('FoodScreen');
export const FoodsScreen = fetched('FoodsScreen');
export const NewFoodScreen = fetched('NewFoodScreen');
export const AccountRedirect = fetched('AccountRedirect');
export const MaterialScreen = fetched('MaterialScreen');
export const MaterialsScreen = fetched('MaterialsScreen');
export const NewMaterialScreen = fetched('NewMaterialScreen');
export const MoreScreen = fetched('MoreScreen');
export const PackScreen = fetched('PackScreen');
export const PacksScreen = fetched('PacksScreen');
export const NewPackScreen = fetched('NewPackScreen');
export const RouteScreen = fetched('RouteScreen');
export const RoutesScreen = fetched('RoutesScreen');
export const NewRouteScreen = fetched('NewRouteScreen');
export const EditStudyScreen = fetched('EditStudyScreen');
export const StudyScreen = fetched('StudyScreen');
export const StudiesListScreen = fetched('StudiesListScreen');
export const NewStudyScreen = fetched('NewStudyScreen');
export const WallScreen = fetched('WallScreen');
export const WallsScreen = fetched('WallsScreen');
export const NewWallScreen = fetched('NewWallScreen');
export const GalleryScreen = fetched('GalleryScreen');
