import { useFonts } from 'expo-font';
import { useEffect, useState } from 'react';
import splineSans400 from '../../assets/fonts/SplineSans_400Regular.ttf';
import splineSans500 from '../../assets/fonts/SplineSans_500Medium.ttf';
import splineSans600 from '../../assets/fonts/SplineSans_600SemiBold.ttf';
import splineSansMono400 from '../../assets/fonts/SplineSansMono_400Regular.ttf';
import splineSansMono500 from '../../assets/fonts/SplineSansMono_500Medium.ttf';
import { FONT_FILES } from './tokens';

/** Longer than this nobody waits for letters; the device's own then stand in. */
const FONT_PATIENCE_MS = 1500;

/** False until text can be drawn: fonts are there, cannot be had, or take too long. */
export function useFontsSettled(): boolean {
  const [areLoaded, error] = useFonts({
    [FONT_FILES.regular]: splineSans400,
    [FONT_FILES.medium]: splineSans500,
    [FONT_FILES.semibold]: splineSans600,
    [FONT_FILES.mono]: splineSansMono400,
    [FONT_FILES.monoMedium]: splineSansMono500,
  });
  const [isPatienceOver, setIsPatienceOver] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setIsPatienceOver(true), FONT_PATIENCE_MS);
    return () => clearTimeout(timer);
  }, []);
  return areLoaded || error !== null || isPatienceOver;
}
