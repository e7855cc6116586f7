package undermask.report;

import java.util.List;
import undermask.check.PointResult;
import undermask.check.Profile;
import undermask.check.ProfileResult;
import undermask.cost.DriveLoss;
import undermask.cost.MotorHeat;
import undermask.cost.MotorTerminals;
import undermask.cost.Sound;
import undermask.mask.Judgement;

/**
 * What one setting of a sweep gives and costs, the worst over its operating points.
 *
 * @param values of the varied quantities, in their order
 * @param marginDb smallest margin less what the policy asks for is judged; this is the margin itself
 * @param passes whether the policy lets it through
 * @param windingCelsius temperature of the motor winding
 * @param harmonicLoss of the motor, W
 * @param driveLoss W
 * @param sound level without the motor's constant, dB(A)
 * @param toneHz strongest tone
 * @param motorPeak voltage at the motor's terminals, V
 */
record Tradeoff(
        List<String> values,
        double marginDb,
        boolean passes,
        double windingCelsius,
        double harmonicLoss,
        double driveLoss,
        double sound,
        double toneHz,
        double motorPeak) {
    /** Switches are chosen with so much in hand over the largest peak current. */
    private static final double RESERVE = 1.5;

    static Tradeoff of(List<String> values, ProfileResult result) {
        Profile profile = result.profile();
        Outcome outcome = Outcome.of(result);
        Judgement worst = outcome.worst();
        double celsius = Double.NEGATIVE_INFINITY;
        double harmonic = 0;
        double drive = 0;
        double peak = 0;
        Sound loudest = null;
        for (PointResult point : result.points()) {
            MotorHeat heat = MotorHeat.of(profile.installation(), point.bridge());
            celsius = Math.max(celsius, heat.windingCelsius());
            harmonic = Math.max(harmonic, heat.harmonicCopperLoss() + heat.harmonicCoreLoss());
            drive = Math.max(
                    drive,
                    DriveLoss.of(point.bridge(), RESERVE * Math.max(1, profile.peakCurrent()))
                            .total());
            Sound sound = Sound.of(point.bridge());
            loudest = loudest == null || sound.level() > loudest.level() ? sound : loudest;
            peak = Math.max(
                    peak,
                    MotorTerminals.of(profile.installation(), point.bridge()).peak());
        }
        return new Tradeoff(
                values,
                worst.marginDb(),
                outcome.passes(),
                celsius,
                harmonic,
                drive,
                loudest.level(),
                loudest.toneHz(),
                peak);
    }

    /** The same with another word on whether it passes. */
    Tradeoff passing(boolean really) {
        return new Tradeoff(
                values, marginDb, really, windingCelsius, harmonicLoss, driveLoss, sound, toneHz, motorPeak);
    }

    /** Whether another setting is at least as good in everything and better in something. */
    boolean beatenBy(Tradeoff other) {
        boolean asGood = other.marginDb >= marginDb
                && other.windingCelsius <= windingCelsius
                && other.driveLoss <= driveLoss
                && other.sound <= sound;
        boolean better = other.marginDb > marginDb
                || other.windingCelsius < windingCelsius
                || other.driveLoss < driveLoss
                || other.sound < sound;
        return asGood && better;
    }

    /** What it heats beyond the load itself: drive and harmonics, W. */
    double addedHeat() {
        return driveLoss + harmonicLoss;
    }
}
