package undermask.network;

/**
 * A line between two pairs of terminals. What enters one conductor at an end leaves the other at the same end, so the
 * pairs may lie at any potential to each other.
 *
 * <p>Source: telegraph equations; I1 = (V1·cosh γl − V2)/(Zc·sinh γl), e.g. Pozar, Microwave Engineering, table 4.1
 * (from memory).
 */
record LineSection(int nearCore, int nearReturn, int farCore, int farReturn, LossyLine line) implements Element {
    @Override
    public void stamp(NodalEquations equations, double omega) {
        double seriesRe = line.resistance() * Math.sqrt(omega / (2 * Math.PI * line.resistanceHz()));
        double seriesIm = omega * line.inductance();
        double shuntRe = omega * line.capacitance() * line.lossFactor();
        double shuntIm = omega * line.capacitance();
        // γ = √(Z'Y'), in the first quadrant
        double productRe = seriesRe * shuntRe - seriesIm * shuntIm;
        double productIm = seriesRe * shuntIm + seriesIm * shuntRe;
        double modulus = Math.hypot(productRe, productIm);
        double beta = Math.sqrt((modulus - productRe) / 2);
        double alpha = productIm / (2 * beta);
        // 1/Zc = Y'/γ
        double square = alpha * alpha + beta * beta;
        double waveRe = (shuntRe * alpha + shuntIm * beta) / square;
        double waveIm = (shuntIm * alpha - shuntRe * beta) / square;
        // with e = exp(−γl): coth γl = (1 + e²)/(1 − e²), 1/sinh γl = 2e/(1 − e²); nothing overflows on a long line
        double decay = Math.exp(-alpha * line.length());
        double eRe = decay * Math.cos(beta * line.length());
        double eIm = -decay * Math.sin(beta * line.length());
        double e2Re = eRe * eRe - eIm * eIm;
        double e2Im = 2 * eRe * eIm;
        double downRe = 1 - e2Re;
        double downIm = -e2Im;
        double down = downRe * downRe + downIm * downIm;
        double cothRe = ((1 + e2Re) * downRe + e2Im * downIm) / down;
        double cothIm = (e2Im * downRe - (1 + e2Re) * downIm) / down;
        double cschRe = 2 * (eRe * downRe + eIm * downIm) / down;
        double cschIm = 2 * (eIm * downRe - eRe * downIm) / down;
        double selfRe = waveRe * cothRe - waveIm * cothIm;
        double selfIm = waveRe * cothIm + waveIm * cothRe;
        double mutualRe = -(waveRe * cschRe - waveIm * cschIm);
        double mutualIm = -(waveRe * cschIm + waveIm * cschRe);
        equations.admittance(nearCore, nearReturn, selfRe, selfIm);
        equations.admittance(farCore, farReturn, selfRe, selfIm);
        equations.transferAdmittance(nearCore, nearReturn, farCore, farReturn, mutualRe, mutualIm);
        equations.transferAdmittance(farCore, farReturn, nearCore, nearReturn, mutualRe, mutualIm);
    }
}
