import { useState } from 'react';

export interface PictureSource {
  type: string;
  srcset: string;
}

export interface PictureData {
  id: string;
  width: number;
  height: number;
  alt: string;
  /** A blurred likeness as a data address, shown until the picture is there. */
  placeholder?: string | null;
  sources: PictureSource[];
  src: string;
}

export interface PictureProps {
  picture: PictureData;
  /** How wide it is shown, in the words of the `sizes` attribute. */
  sizes: string;
  /** For the first picture of a page: fetched at once. */
  priority?: boolean;
  /** Fill the box it stands in and crop, rather than keep its own shape. */
  fill?: boolean;
}

export function Picture({ picture, sizes, priority = false, fill = false }: PictureProps) {
  const [lost, setLost] = useState(false);
  const shape = fill ? 'h-full w-full object-cover' : 'h-auto w-full';
  return (
    <picture className={`block overflow-hidden rounded-chip bg-grey-wash ${fill ? 'h-full' : ''}`}>
      {!lost && picture.sources.map((source) => <source key={source.type} type={source.type} srcSet={source.srcset} sizes={sizes} />)}
      <img
        src={picture.src}
        alt={picture.alt}
        width={picture.width}
        height={picture.height}
        loading={priority ? 'eager' : 'lazy'}
        fetchPriority={priority ? 'high' : 'auto'}
        decoding={priority ? 'auto' : 'async'}
        onError={() => setLost(true)}
        className={`block bg-cover bg-center ${shape}`}
        style={picture.placeholder ? { backgroundImage: `url("${picture.placeholder}")` } : undefined}
      />
    </picture>
  );
}
