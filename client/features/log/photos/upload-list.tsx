import { useId } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import type { Upload, Uploads } from './use-uploads.ts';

/** Photos on their way with how far they have come, and those that did not get there. */
export function UploadList({ uploads }: { uploads: Uploads }) {
  if (uploads.list.length === 0) return null;
  return (
    <ul className="mt-2 border-t border-rule">
      {uploads.list.map((upload) => (
        <li key={upload.id} className="border-b border-rule py-2">
          <UploadRow
            upload={upload}
            onRetry={() => uploads.retry(upload.id)}
            onDrop={() => uploads.drop(upload.id)}
          />
        </li>
      ))}
    </ul>
  );
}

interface UploadRowProps {
  upload: Upload;
  onRetry: () => void;
  onDrop: () => void;
}

function UploadRow({ upload: { file, progress, problem }, onRetry, onDrop }: UploadRowProps) {
  const id = useId();
  return (
    <div className="flex flex-wrap items-center gap-x-3 gap-y-1">
      <div className="min-w-0 flex-1 basis-40">
        <div id={id} className="truncate">
          {file.name}
        </div>
        {problem === null ? (
          <progress
            aria-labelledby={id}
            value={progress}
            max={1}
            className="mt-1 block h-1.5 w-full appearance-none overflow-hidden rounded-sm bg-rule [&::-moz-progress-bar]:bg-ink [&::-webkit-progress-bar]:bg-rule [&::-webkit-progress-value]:bg-ink"
          />
        ) : (
          <p role="alert" className="text-note text-red">
            <span aria-hidden="true">▲ </span>
            Not added. {problem}
          </p>
        )}
      </div>
      {problem !== null && <Button onClick={onRetry}>Try again</Button>}
      <Button variant="plain" onClick={onDrop}>
        {problem === null ? 'Stop' : 'Drop'}
      </Button>
    </div>
  );
}
