import type { Figures } from './use-figures';

const CELSIUS = /([-−]?\d+(?:\.\d+)?) °C/g;
const KELVIN_APART = /(\d+(?:\.\d+)?) K\b/g;

/** The engine warns in °C and K; here in the reader's units. */
export function engineWords(message: string, show: Pick<Figures, 'unitSystem' | 'exact'>): string {
  const sentence = message.charAt(0).toUpperCase() + message.slice(1);
  if (show.unitSystem === 'metric') return sentence;
  return sentence
    .replace(CELSIUS, (_all, figures: string) =>
      show.exact(Number(figures.replace('−', '-')), 'temperature_C'),
    )
    .replace(KELVIN_APART, (_all, figures: string) =>
      show.exact(Number(figures), 'temperature_difference_K'),
    );
}
