import { Notice } from '../../../components/notice.tsx';

/** What the program will not say. */
export function NoTaxAdvice() {
  return (
    <Notice>
      Hidewright gives no tax advice and knows no rates: they are the ones that you enter. Which tax
      applies to what you sell is for your local authority and a licensed accountant to say.
    </Notice>
  );
}
