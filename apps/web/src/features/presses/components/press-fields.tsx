import { DecimalField } from '../../../components/decimal-field.tsx';
import { LengthField } from '../../../components/length-field.tsx';
import { TextField } from '../../../components/text-field.tsx';

/** What a press takes, and what it manages as its owner has found. */
export function PressFields() {
  return (
    <>
      <TextField name="name" label="Name" help="such as Clicker by the window" />
      <LengthField name="bedWidthMm" label="Width of the bed" />
      <LengthField name="bedDepthMm" label="Depth of the bed" />
      <LengthField
        name="throatMm"
        label="Throat"
        optional
        whenEmpty="null"
        help="from the column to the front; empty where it is open on both sides"
      />
      <LengthField
        name="ruleMm"
        label="Cutting edge it manages"
        optional
        whenEmpty="null"
        help="for one strike, in your leather; the maker’s manual comes first"
      />
      <DecimalField
        name="reliefAreaMm2"
        label="Relief it manages"
        unit="mm²"
        optional
        whenEmpty="null"
        help="raised area of a plate that one strike still marks evenly"
      />
      <LengthField
        name="shutHeightMm"
        label="Shut height"
        optional
        whenEmpty="null"
        help="between bed and head at the bottom of the stroke"
      />
    </>
  );
}
