import { Notice } from '../notice';

/** For people whose role may look at these things and no more; `what` as 'packs'. */
export function ReadingOnly({ what, hasFields = false }: { what: string; hasFields?: boolean }) {
  return (
    <Notice title="Reading only">
      {`Engineers make and change ${what}.${hasFields ? ' What you try in these fields is not kept.' : ''}`}
    </Notice>
  );
}
