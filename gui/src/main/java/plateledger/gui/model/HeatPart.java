package plateledger.gui.model;

import plateledger.quantity.Estimate;
import plateledger.reduce.StationResult;

/** The parts into which the heater's flux at a station is booked, in the order they are stacked. */
public enum HeatPart {
    /** Convected to the stream. */
    CONVECTION("convection") {
        @Override
        Estimate of(StationResult station) {
            return station.qConvection();
        }
    },
    /** Radiated to the walls. */
    RADIATION("radiation") {
        @Override
        Estimate of(StationResult station) {
            return station.qRadiation();
        }
    },
    /** Through the back. */
    BACK("back") {
        @Override
        Estimate of(StationResult station) {
            return station.qBack();
        }
    },
    /** Carried off along the sheet; negative where heat arrives. */
    CONDUCTION("conduction along the sheet") {
        @Override
        Estimate of(StationResult station) {
            return station.qConduction();
        }
    };

    private final String label;

    HeatPart(String label) {
        this.label = label;
    }

    /** The word shown. */
    public String label() {
        return label;
    }

    abstract Estimate of(StationResult station);
}
