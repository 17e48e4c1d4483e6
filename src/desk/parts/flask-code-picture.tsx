import QRCode from 'react-qr-code';

/** Modules along the side of a flask code's QR symbol: version 1, which at level Q holds our eight to ten characters. */
export const modules = 21;
/** Modules of white that ISO/IEC 18004 asks for on every side. */
export const quietModules = 4;

const whole = modules + 2 * quietModules;
const inset = `${(quietModules / whole) * 100}%`;
const side = `${(modules / whole) * 100}%`;

/** Props of {@link FlaskCodePicture}. */
export interface FlaskCodePictureProps {
  readonly code: string;
  /** Sets the width of the whole, quiet zone included; the code itself is 21/29 of it. */
  readonly className: string;
}

/** A flask's code as a QR symbol with its quiet zone, black on white in every theme so that it can be scanned from a screen. */
export const FlaskCodePicture = ({ code, className }: FlaskCodePictureProps) => (
  <div className={`relative aspect-square bg-[#fff] ${className}`}>
    <QRCode
      value={code}
      level="Q"
      role="img"
      aria-label={`QR code of ${code}`}
      className="absolute"
      style={{ left: inset, top: inset, width: side, height: side }}
      shapeRendering="crispEdges"
    />
  </div>
);
