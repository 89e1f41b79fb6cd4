import { Link } from "react-router";

interface TrackNoteProps {
  /** `sentence` is null while the track's file waits for an answer. */
  track: { sentence: string | null };
  mayEdit: boolean;
}

/** Says that a storm's wind is parametric, and leads to its track. */
export function TrackNote({ track, mayEdit }: TrackNoteProps) {
  return (
    <div className="mb-4 border-l-4 border-quiet py-1 pl-3">
      <p className="max-w-prose">
        {track.sentence ??
          "The track's file leaves a question open: which storm, or whose analysis. Nothing is computed before it is answered."}
        {track.sentence && " For screening only. A record with wind, where one is brought, takes its place."}
      </p>
      {mayEdit && (
        <p className="mt-1">
          <Link to="track" className="underline">
            {track.sentence ? "Track and parameters" : "Answer it"}
          </Link>
        </p>
      )}
    </div>
  );
}
