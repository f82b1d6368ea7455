import { ConfirmWithReason } from '../../components/confirm-with-reason';
import { type Offer, useChangeOffer } from './requests/change-offer';

/** Ends an offer before its last day. */
export function EndOfferDialog({ offer, onClose }: { offer: Offer; onClose: () => void }) {
  const change = useChangeOffer();
  return (
    <ConfirmWithReason
      title="End the offer"
      description={`Of ${offer.supplier.name}, packaging ${offer.packaging}. It counts no more and stays on record.`}
      act="End the offer"
      initialValues={{}}
      error={change.error}
      onConfirm={({ reason }) =>
        change.mutateAsync({ deed: 'end', id: offer.id, form: { reason, version: offer.version } })
      }
      onClose={onClose}
    />
  );
}
