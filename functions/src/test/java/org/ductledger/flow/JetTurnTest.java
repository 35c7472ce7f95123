package org.ductledger.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class JetTurnTest {
    private static final double GAMMA = 1.4;

    @Test
    void aJetAtTheBackPressureGoesStraightOn() {
        assertEquals(0, JetTurn.turn(2, 1, GAMMA));
        assertEquals(0, JetTurn.turn(1, 1, GAMMA));
    }

    @ParameterizedTest
    @ValueSource(doubles = {1, 1.000001, 1.5, 3, 20})
    void intoVacuumTheJetTurnsByAllThatIsLeftOfThePrandtlMeyerAngle(double mach) {
        assertEquals(Fan.angleLeft(mach, GAMMA), JetTurn.turn(mach, 1e-300, GAMMA), 1e-12);
    }

    @ParameterizedTest
    @CsvSource({"1.5, 0.9", "2, 0.5", "2, 0.01", "4, 0.3", "1.01, 0.97"})
    void anUnderexpandedJetSwellsByTheDifferenceOfPrandtlMeyerAngles(double mach, double p) {
        double behind = Isentropic.machFromPOverP0(p * Isentropic.pOverP0(mach, GAMMA), GAMMA);
        double difference = Fan.prandtlMeyerAngle(behind, GAMMA) - Fan.prandtlMeyerAngle(mach, GAMMA);
        assertEquals(difference, JetTurn.turn(mach, p, GAMMA), 1e-12);
    }

    /** The textbook way round: the shock angle from p2/p1, the deflection from the shock angle (NACA 1135). */
    @ParameterizedTest
    @CsvSource({"1.5, 1.1", "2, 1.5", "2, 4.4", "4, 3", "4, 15"})
    void anOverexpandedJetIsTurnedInByAnObliqueShock(double mach, double p) {
        double sine = Math.sqrt((1 + (p - 1) * (GAMMA + 1) / (2 * GAMMA)) / (mach * mach));
        double shockAngle = Math.asin(sine);
        double normal = mach * mach * sine * sine;
        double tangent =
                2 / Math.tan(shockAngle) * (normal - 1) / (mach * mach * (GAMMA + Math.cos(2 * shockAngle)) + 2);
        assertEquals(-Math.toDegrees(Math.atan(tangent)), JetTurn.turn(mach, p, GAMMA), 1e-12);
    }

    @Test
    void aNormalShockTurnsNothing() {
        assertEquals(0, JetTurn.turn(2, 4.5, GAMMA), 1e-6);
        assertTrue(Double.isNaN(JetTurn.turn(2, 4.51, GAMMA)));
    }

    /** Of weak waves either way, turn = sqrt(M^2-1)/(gamma M^2) times the relative change of pressure. */
    @ParameterizedTest
    @ValueSource(doubles = {1e-3, 1e-6, 1e-9, 1e-12})
    void weakWavesTurnByTheSameSlope(double change) {
        double slope = Math.toDegrees(Math.sqrt(3) / (GAMMA * 4));
        double up = (1 + change) - 1;
        double down = 1 - (1 - change);
        assertEquals(-slope * up, JetTurn.turn(2, 1 + change, GAMMA), slope * up * change);
        assertEquals(slope * down, JetTurn.turn(2, 1 - change, GAMMA), slope * down * (change + 1e-14));
    }
}
