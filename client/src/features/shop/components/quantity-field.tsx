import { useState, type ReactElement } from 'react';
import { Press } from '../../../components/press';
import { mostOfOne, setBasketQuantity } from '../basket';

interface QuantityFieldProps {
  listingId: number;
  title: string;
  quantity: number;
}

/** How many of one thing. An emptied field waits for the next digit; only the button takes the thing out. */
export function QuantityField({ listingId, title, quantity }: QuantityFieldProps): ReactElement {
  const [typed, setTyped] = useState<string>();
  const change = (text: string): void => {
    setTyped(text);
    const wanted = Number(text);
    if (Number.isInteger(wanted) && wanted >= 1 && wanted <= mostOfOne) setBasketQuantity(listingId, wanted);
  };
  return (
    <span className="quantity">
      <input
        type="number"
        inputMode="numeric"
        min={1}
        max={mostOfOne}
        step={1}
        aria-label={`How many of ${title}`}
        value={typed ?? quantity}
        onChange={({ target }) => {
          change(target.value);
        }}
        onBlur={() => {
          setTyped(undefined);
        }}
      />
      <Press
        onPress={() => {
          setBasketQuantity(listingId, 0);
        }}
      >
        Take out
      </Press>
    </span>
  );
}
