import { Dialog } from '#src/ui/dialog.tsx';
import { FlaskCodePicture } from '../../parts/flask-code-picture.tsx';

/** Props of {@link LargeCode}. */
export interface LargeCodeProps {
  readonly code: string;
  readonly onClose: () => void;
}

/** One code as large as the window allows, to be scanned from across a bench. */
export const LargeCode = ({ code, onClose }: LargeCodeProps) => (
  <Dialog open onClose={onClose} title={code}>
    <FlaskCodePicture code={code} className="mx-auto w-[min(500px,80vw,70vh)] rounded-2xl" />
  </Dialog>
);
