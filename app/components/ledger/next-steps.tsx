import { Link } from "react-router";

interface NextStepsProps {
  home: string;
  boxes: number;
  storms: number;
  columns: number;
  mayEdit: boolean;
}

/** What comes next, until there is something to run. */
export function NextSteps({ home, boxes, storms, columns, mayEdit }: NextStepsProps) {
  const steps = [
    {
      title: "Draw a study box",
      done: boxes > 0,
      to: `${home}/area/new`,
      text: "The piece of sea that the client asks about: drawn on the map, or its corners typed.",
    },
    {
      title: "Bring a storm",
      done: storms > 0,
      to: `${home}/storms/new`,
      text: "A wind record from a buoy or an airport; rain and heat where there are any. A sample file lies ready there.",
    },
    {
      title: "Describe the water",
      done: columns > 0,
      to: `${home}/water/new`,
      text: "Temperature, salinity and depth of the surface layer, and what lies below it.",
    },
  ];
  const next = steps.find(({ done }) => !done);
  return (
    <ol className="mt-6 border-t-2 border-ink">
      {steps.map((step, index) => (
        <li key={step.title} className="flex flex-wrap items-center gap-x-5 gap-y-2 border-b border-hairline py-4">
          <span className="text-large font-bold text-quiet">{index + 1}</span>
          <div className="min-w-0 grow basis-64">
            <p className="font-bold">{step.title}</p>
            <p className="max-w-prose text-slate">{step.text}</p>
          </div>
          {step.done ? (
            <span className="text-small text-quiet">done</span>
          ) : (
            mayEdit && (
              <Link to={step.to} className={`button ${step === next ? "button-primary" : ""}`}>
                {step.title}
              </Link>
            )
          )}
        </li>
      ))}
    </ol>
  );
}
