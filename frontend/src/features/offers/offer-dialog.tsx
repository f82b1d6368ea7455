import { chakra } from '@chakra-ui/react';
import { useFormikContext } from 'formik';
import { string } from 'yup';
import { type Problem, problemOf } from '../../api/problem';
import { ConfirmWithReason } from '../../components/confirm-with-reason';
import { FormField } from '../../components/form-field';
import { FormSelect } from '../../components/form-select';
import type { OfferedPart } from './offered-part';
import { priceEcho, readPrices, writePrices } from './price-lines';
import { type Offer, type OfferDeed, useChangeOffer } from './requests/change-offer';
import { useSuppliers } from './requests/list-suppliers';

interface Values extends Record<string, string> {
  supplier: string;
  packaging: string;
  minimumOrder: string;
  orderMultiple: string;
  leadTimeDays: string;
  validFrom: string;
  validUntil: string;
  prices: string;
}

const pieces = (words: string) =>
  string()
    .trim()
    .required(words)
    .matches(/^[1-9]\d{0,8}$/, 'A whole number of pieces, such as 1000.');

const rules = {
  supplier: string().required('Choose the supplier.'),
  packaging: string().required('Choose the packaging.'),
  minimumOrder: pieces('Give the smallest order.'),
  orderMultiple: pieces('Give the multiple; 1 where any number can be ordered.'),
  leadTimeDays: string()
    .trim()
    .required('Give the lead time.')
    .matches(/^\d{1,4}$/, 'A whole number of days.'),
  validFrom: string().required('Give the first day.'),
  validUntil: string()
    .required('Give the last day.')
    .test('order', 'It ends before it begins.', function ends(value) {
      const { validFrom } = this.parent as Values;
      return value === '' || validFrom === '' || validFrom <= value;
    }),
  prices: string().test('prices', function readable(text) {
    const read = readPrices(text ?? '');
    return read.ok || this.createError({ message: read.message });
  }),
};

function valuesOf(offer: Offer | undefined): Values {
  return {
    supplier: offer === undefined ? '' : String(offer.supplier.id),
    packaging: offer?.packaging ?? '',
    minimumOrder: offer === undefined ? '' : String(offer.minimumOrder),
    orderMultiple: offer === undefined ? '' : String(offer.orderMultiple),
    leadTimeDays: offer === undefined ? '' : String(offer.leadTimeDays),
    validFrom: offer?.validFrom ?? '',
    validUntil: offer?.validUntil ?? '',
    prices: offer === undefined ? '' : writePrices(offer.priceBreaks),
  };
}

function deedOf(part: OfferedPart, offer: Offer | undefined, values: Values & { reason: string }): OfferDeed {
  const read = readPrices(values.prices);
  const terms = {
    supplierId: Number(values.supplier),
    packaging: values.packaging,
    minimumOrder: Number(values.minimumOrder),
    orderMultiple: Number(values.orderMultiple),
    leadTimeDays: Number(values.leadTimeDays),
    validFrom: values.validFrom,
    validUntil: values.validUntil,
    priceBreaks: read.ok ? read.breaks : [],
    reason: values.reason,
  };
  return offer === undefined
    ? { deed: 'enter', form: { partId: part.id, ...terms } }
    : { deed: 'change', id: offer.id, form: { version: offer.version, ...terms } };
}

const Pair = chakra('div', {
  base: { display: 'grid', gap: 4, gridTemplateColumns: { base: 'minmax(0, 1fr)', sm: '1fr 1fr' } },
});

/** The prices, with what was understood of them. */
function Prices({ problem }: { problem: Problem | undefined }) {
  const { values } = useFormikContext<Values>();
  const refusal = problem?.fields.find(({ pointer }) => pointer.startsWith('/priceBreaks'))?.message;
  return (
    <FormField
      name="prices"
      label="Prices, one a line: pieces and € a piece"
      placeholder={'100 0.0092\n1000 0.0069'}
      multiline
      echo={priceEcho(values.prices)}
      refusal={refusal}
    />
  );
}

export interface OfferDialogProps {
  part: OfferedPart;
  /** The one to be changed; a new one is entered where absent. */
  offer?: Offer;
  onClose: () => void;
}

/** Enters what a supplier offers, or changes its terms. */
export function OfferDialog({ part, offer, onClose }: OfferDialogProps) {
  const change = useChangeOffer();
  const suppliers = useSuppliers();
  const problem = change.error === null ? undefined : problemOf(change.error);
  const act = offer === undefined ? 'Enter the offer' : 'Change the offer';
  return (
    <ConfirmWithReason
      title={act}
      description={`For ${part.manufacturerPartNumber}.`}
      act={act}
      initialValues={valuesOf(offer)}
      rules={rules}
      error={change.error}
      onConfirm={(values) => change.mutateAsync(deedOf(part, offer, values))}
      onClose={onClose}
    >
      {problem?.status === 409 && (
        <chakra.p role="status" fontSize="sm">
          The offer has been read again. What you wrote is still here; look at the list behind before you send
          it.
        </chakra.p>
      )}
      <FormSelect
        name="supplier"
        label="Supplier"
        options={(suppliers.data ?? []).map(({ id, name }) => ({ value: String(id), words: name }))}
        refusal={
          problem?.at('/supplierId') ?? (suppliers.isError ? problemOf(suppliers.error).title : undefined)
        }
      />
      <FormSelect
        name="packaging"
        label="Packaging"
        options={part.orderingCodes.map(({ packaging, description, quantity }) => ({
          value: packaging,
          words: `${packaging}: ${description}, ${quantity.toLocaleString('en')}`,
        }))}
        refusal={problem?.at('/packaging')}
      />
      <Pair>
        <FormField
          name="minimumOrder"
          label="Smallest order, pieces"
          refusal={problem?.at('/minimumOrder')}
        />
        <FormField name="orderMultiple" label="In multiples of" refusal={problem?.at('/orderMultiple')} />
        <FormField name="validFrom" label="Valid from" type="date" refusal={problem?.at('/validFrom')} />
        <FormField name="validUntil" label="Valid until" type="date" refusal={problem?.at('/validUntil')} />
      </Pair>
      <FormField name="leadTimeDays" label="Lead time, days" refusal={problem?.at('/leadTimeDays')} />
      <Prices problem={problem} />
    </ConfirmWithReason>
  );
}
