import type { Quotation } from '#shared/survey-orders/pricing.ts';
import { formatSum } from '#web/lib/format.ts';

interface Props {
  quotation: Quotation;
  /** Says what of it is the surveyor's, to whom it matters. */
  hasSurveyorPart?: boolean;
}

/** A quotation line by line; the lines add up to the total. */
export function QuotationTable({ quotation, hasSurveyorPart = false }: Props) {
  return (
    <table className="w-full border-collapse text-[0.9375rem] leading-6">
      <caption className="sr-only">Quotation</caption>
      <tbody>
        {quotation.lines.map(({ label, amount }) => (
          <tr key={label}>
            <th scope="row" className="border-b border-rule py-2 pr-4 text-left font-normal">
              {label}
            </th>
            <td className="border-b border-rule py-2 text-right whitespace-nowrap">{formatSum(amount)}</td>
          </tr>
        ))}
        <tr>
          <th scope="row" className="py-2 pr-4 text-left font-medium">
            In all
          </th>
          <td className="py-2 text-right font-medium whitespace-nowrap">{formatSum(quotation.total)}</td>
        </tr>
        {hasSurveyorPart && (
          <tr>
            <th scope="row" className="border-t border-ink py-2 pr-4 text-left font-medium">
              Of that, to the surveyor
            </th>
            <td className="border-t border-ink py-2 text-right font-medium whitespace-nowrap">
              {formatSum(quotation.surveyorPart)}
            </td>
          </tr>
        )}
      </tbody>
    </table>
  );
}
