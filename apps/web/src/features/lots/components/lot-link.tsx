import { TextLink } from '../../../components/text-link.tsx';

/** A lot by its tag, as something a thumb can press. */
export function LotLink({ lotId, tag }: { lotId: number; tag: string }) {
  return (
    <TextLink className="inline-flex min-h-11 items-center" to={`/stockroom/lots/${lotId}`}>
      {tag}
    </TextLink>
  );
}
