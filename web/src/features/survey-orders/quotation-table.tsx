import type { Quotation } from '#shared/survey-orders/pricing.ts';
import { formatMoney } from '#web/lib/format.ts';

/** A quotation line by line; the lines add up to the total. */
export function QuotationTable({ quotation }: { quotation: Quotation }) {
  return (
    <table className="w-full border-collapse text-[0.9375rem] leading-6">
      <caption className="sr-only">Quotation</caption>
      <tbody>
        {quotation.lines.map(({ label, amount }) => (
          <tr key={label}>
            <th scope="row" className="border-b border-rule py-2 pr-4 text-left font-normal">
              {label}
            </th>
            <td className="border-b border-rule py-2 text-right whitespace-nowrap">{formatMoney(amount)}</td>
          </tr>
        ))}
        <tr>
          <th scope="row" className="py-2 pr-4 text-left font-medium">
            In all
          </th>
          <td className="py-2 text-right font-medium whitespace-nowrap">{formatMoney(quotation.total)}</td>
        </tr>
      </tbody>
    </table>
  );
}
