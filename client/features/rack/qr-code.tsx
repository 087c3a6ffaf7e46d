import { useQuery } from '@tanstack/react-query';

interface QrCodeProps {
  /** what it says to whoever reads it */
  text: string;
  label: string;
  className?: string;
}

/** A QR code (ISO/IEC 18004) in black on white, whatever the theme, for a camera reads it from paper. */
export function QrCode({ text, label, className }: QrCodeProps) {
  const { data } = useQuery({
    queryKey: ['qr-code', text],
    queryFn: () => drawn(text),
    staleTime: Infinity,
  });
  if (!data) return <span className={className} />;
  return (
    <svg role="img" aria-label={label} viewBox={`0 0 ${data.size} ${data.size}`} className={className}>
      <rect width={data.size} height={data.size} fill="#fff" />
      <path d={data.path} fill="#000" shapeRendering="crispEdges" />
    </svg>
  );
}

/** The quiet zone, in modules; ISO/IEC 18004 asks for four. */
const QUIET = 4;

async function drawn(text: string): Promise<{ size: number; path: string }> {
  const { default: qrcode } = await import('qrcode');
  const { modules } = qrcode.create(text, { errorCorrectionLevel: 'M' });
  const { size } = modules;
  const path = Array.from({ length: size * size }, (_, i) =>
    modules.get(Math.floor(i / size), i % size)
      ? `M${(i % size) + QUIET} ${Math.floor(i / size) + QUIET}h1v1h-1z`
      : '',
  ).join('');
  return { size: size + 2 * QUIET, path };
}
