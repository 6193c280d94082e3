export interface TextPart {
  kind: 'words' | 'link';
  text: string;
}

const LINK = /(https?:\/\/[^\s<>"]+)/;

/** A plain message cut where its web addresses begin and end. */
export function splitAtLinks(text: string): TextPart[] {
  return text
    .split(LINK)
    .map((part): TextPart => ({
      kind: part.startsWith('http') && LINK.test(part) ? 'link' : 'words',
      text: part,
    }))
    .filter((part) => part.text !== '');
}

/** '2026-12-01 14:05 UTC': the same on every machine. */
export function messageTime(isoTime: string): string {
  return `${isoTime.slice(0, 10)} ${isoTime.slice(11, 16)} UTC`;
}
