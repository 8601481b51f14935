import { usePictures, type PictureUpload } from '../bench.ts';
import { textButton } from '../block-frame.tsx';

function mb(bytes: number): string {
  return (bytes / 1_000_000).toFixed(1);
}

function words({ state, sent, size, problem }: PictureUpload): string {
  switch (state) {
    case 'waiting': return `Waiting its turn, ${mb(size)} MB`;
    case 'going': return `${mb(sent)} of ${mb(size)} MB`;
    case 'checking': return 'Gone up. The server is making it ready.';
    case 'stopped': return 'Stopped. It is kept here.';
    case 'failed': case 'refused': return problem ?? 'It did not go up.';
  }
}

/** A photo on its way up, in the place it will have. */
export function UploadDesk({ upload }: { upload: PictureUpload }) {
  const pictures = usePictures();
  const { id, name, state } = upload;
  const wrong = state === 'failed' || state === 'refused';
  return (
    <li className="m-0! grid grid-cols-[6.5rem_minmax(0,1fr)] gap-x-4 border-b border-rule py-3 wide:grid-cols-[11rem_minmax(0,1fr)]">
      <div className="aspect-[4/3] overflow-hidden bg-grey-wash">
        {/* A likeness from this browser's memory; a format it cannot show just leaves the ground. */}
        {upload.preview && <img src={upload.preview} alt="" className="h-full w-full object-cover opacity-60" onError={(event) => { event.currentTarget.hidden = true; }} />}
      </div>
      <div>
        <p className="font-semibold break-all">{name}</p>
        <p className={`mt-1 text-small ${wrong ? 'font-semibold text-lead' : 'text-ink-soft'}`} {...(wrong ? { role: 'alert' } : {})}>{words(upload)}</p>
        <div className="mt-1.5 flex gap-4 text-small">
          {(state === 'going' || state === 'waiting') && <button type="button" className={textButton} onClick={() => pictures.stop(id)} aria-label={`Stop ${name}`}>Stop</button>}
          {(state === 'failed' || state === 'stopped') && <button type="button" className={textButton} onClick={() => pictures.retry(id)} aria-label={`Try ${name} again`}>Try again</button>}
          {(wrong || state === 'stopped') && <button type="button" className={textButton} onClick={() => pictures.dismiss(id)} aria-label={`Leave ${name} out`}>Leave it out</button>}
        </div>
      </div>
    </li>
  );
}
