import { LocateFixed } from "lucide-react";
import { useEffect, useState } from "react";
import type { Position } from "../../server/contracts/common.ts";
import { degreesProblem, parseDegrees, parsePair } from "../lib/coordinates.ts";
import { Button } from "./button.tsx";
import { TextField } from "./text-field.tsx";

interface PositionFieldsProps {
  position: Position | null;
  onPosition(position: Position): void;
  problem?: string;
}

const shown = (value: number | undefined) => (value === undefined ? "" : value.toFixed(5));

/** Latitude and longitude typed by hand, or taken from the device. */
export function PositionFields({ position, onPosition, problem }: PositionFieldsProps) {
  const [latitude, setLatitude] = useState(shown(position?.latitudeDeg));
  const [longitude, setLongitude] = useState(shown(position?.longitudeDeg));
  const [deviceProblem, setDeviceProblem] = useState<string>();
  useEffect(() => {
    if (position === null) return;
    // A typed number that means the same place stays as it was typed.
    setLatitude((typed) =>
      parseDegrees(typed) === position.latitudeDeg ? typed : shown(position.latitudeDeg),
    );
    setLongitude((typed) =>
      parseDegrees(typed) === position.longitudeDeg ? typed : shown(position.longitudeDeg),
    );
  }, [position]);
  const change = (latitudeText: string, longitudeText: string) => {
    setLatitude(latitudeText);
    setLongitude(longitudeText);
    const pasted = parsePair(latitudeText) ?? parsePair(longitudeText);
    if (pasted !== null) {
      setLatitude(shown(pasted.latitudeDeg));
      setLongitude(shown(pasted.longitudeDeg));
      return onPosition(pasted);
    }
    const latitudeDeg = parseDegrees(latitudeText);
    const longitudeDeg = parseDegrees(longitudeText);
    const fits =
      degreesProblem(latitudeText, "latitude") === null &&
      degreesProblem(longitudeText, "longitude") === null;
    if (fits && latitudeDeg !== null && longitudeDeg !== null) onPosition({ latitudeDeg, longitudeDeg });
  };
  const locate = () => {
    setDeviceProblem(undefined);
    navigator.geolocation.getCurrentPosition(
      ({ coords }) =>
        onPosition({
          latitudeDeg: Number(coords.latitude.toFixed(6)),
          longitudeDeg: Number(coords.longitude.toFixed(6)),
        }),
      () =>
        setDeviceProblem("This device does not tell its position. Type it, or look for the nearest town."),
      { enableHighAccuracy: true, timeout: 10_000 },
    );
  };
  return (
    <fieldset className="m-0 border-0 p-0">
      <legend className="sr-only">Position</legend>
      <div className="grid grid-cols-2 items-start gap-3">
        <TextField
          label="Latitude"
          value={latitude}
          onValue={(text) => change(text, longitude)}
          placeholder="53.36 N"
          problem={degreesProblem(latitude, "latitude") ?? undefined}
        />
        <TextField
          label="Longitude"
          value={longitude}
          onValue={(text) => change(latitude, text)}
          placeholder="7.48 W"
          problem={degreesProblem(longitude, "longitude") ?? undefined}
        />
      </div>
      {problem || deviceProblem ? (
        <p role="alert" data-problem="" className="m-0 mt-1 text-sm font-semibold text-redlead">
          {problem ?? deviceProblem}
        </p>
      ) : null}
      <Button kind="plain" className="mt-3" onClick={locate}>
        <LocateFixed size={18} aria-hidden="true" />I stand by it now
      </Button>
    </fieldset>
  );
}
