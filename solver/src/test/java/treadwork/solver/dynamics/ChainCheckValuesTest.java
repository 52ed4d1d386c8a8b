package treadwork.solver.dynamics;

import static org.junit.jupiter.api.Assertions.assertEquals;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import treadwork.model.body.MassProperties;
import treadwork.model.space.Inertia;
import treadwork.model.space.PoseSeries;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.space.WrenchSeries;

/**
 * The recursion against the momentum rates of an invented chain of four bodies, which were computed by differentiating its
 * pose functions numerically with 60 digits and so share no recursion with the code under test.
 */
class ChainCheckValuesTest {

    /** Rounding of some 200 operations on values up to 1e3, with a margin; two independent recursions agree to 3e-13. */
    private static final double ROUNDING = 1e-9;

    private static final int FOOT = 3;

    @ParameterizedTest
    @ValueSource(strings = {"spherical", "sixdof"})
    void reproducesTheMomentumRatesOfTheChain(String variant) throws IOException {
        JsonNode values = values();
        List<Body> bodies = bodies(values, variant);

        List<LoadSeries> loads = LimbLoads.of(
                segmentsFromTheFootUp(values, bodies),
                jointsFromTheFootUp(values, variant),
                ground(values),
                vector(values.get("gravity")));

        for (int k = 0; k <= FOOT; k++) {
            JsonNode joint = values.get(variant).get("joint").get(FOOT - k);
            String name = values.get("bodies").get(FOOT - k).get("name").asText();
            assertNear(vector(joint.get("F_world")), loads.get(k).force().at(0), "force at the " + name + ", N");
            assertNear(vector(joint.get("M_world")), loads.get(k).moment().at(0), "moment at the " + name + ", N·m");
        }
    }

    private static void assertNear(Vector3 expected, Vector3 actual, String what) {
        assertEquals(0, actual.minus(expected).norm(), ROUNDING, what);
    }

    private static JsonNode values() throws IOException {
        Path file = Path.of(System.getProperty("shared", "../shared"), "reference", "chain-check-values.json");
        Assumptions.assumeTrue(Files.exists(file), "skipped: the chain's check values are not at " + file);
        return new ObjectMapper().readTree(file.toFile());
    }

    /** A body's motion in the world at the instant tabulated. */
    private record Body(Rotation labFromBody, Vector3 origin, Vector3 omega, Vector3 alpha, Vector3 acceleration) {

        /** Acceleration of a point that stands {@code arm} from the origin, lab axes, and is fixed in the body. */
        Vector3 accelerationAt(Vector3 arm) {
            return acceleration.plus(alpha.cross(arm)).plus(omega.cross(omega.cross(arm)));
        }
    }

    private static List<Body> bodies(JsonNode values, String variant) {
        List<Body> bodies = new ArrayList<>();
        Body parent = new Body(Rotation.IDENTITY, Vector3.ZERO, Vector3.ZERO, Vector3.ZERO, Vector3.ZERO);
        for (int k = 0; k <= FOOT; k++) {
            JsonNode offset = values.get("offsets").get(k);
            JsonNode joint = values.get(variant).get("q").get(k);
            parent = child(parent, offset.isNull() ? Vector3.ZERO : vector(offset), joint);
            bodies.add(parent);
        }
        return bodies;
    }

    private static Body child(Body parent, Vector3 offset, JsonNode q) {
        Rotation labFromBody = parent.labFromBody().times(rotation(q.get("R")));
        Vector3 spin = labFromBody.times(vector(q.get("w")));
        Vector3 arm = parent.labFromBody().times(offset.plus(vector(q.get("p"))));
        Vector3 slide = labFromBody.times(vector(q.get("v")));
        return new Body(
                labFromBody,
                parent.origin().plus(arm),
                parent.omega().plus(spin),
                parent.alpha()
                        .plus(labFromBody.times(vector(q.get("wd"))))
                        .plus(parent.omega().cross(spin)),
                parent.accelerationAt(arm)
                        .plus(parent.omega().cross(slide).times(2))
                        .plus(labFromBody.times(vector(q.get("a_classic")))));
    }

    private static List<MovingSegment> segmentsFromTheFootUp(JsonNode values, List<Body> bodies) {
        List<MovingSegment> segments = new ArrayList<>();
        for (int k = FOOT; k >= 0; k--) {
            JsonNode stated = values.get("bodies").get(k);
            JsonNode i = stated.get("inertia");
            MassProperties mass = new MassProperties(
                    stated.get("mass").asDouble(),
                    vector(stated.get("com")),
                    new Inertia(
                            i.get(0).asDouble(),
                            i.get(1).asDouble(),
                            i.get(2).asDouble(),
                            i.get(3).asDouble(),
                            i.get(4).asDouble(),
                            i.get(5).asDouble()));
            segments.add(segment(mass, bodies.get(k)));
        }
        return segments;
    }

    private static MovingSegment segment(MassProperties mass, Body body) {
        PoseSeries.Builder pose = new PoseSeries.Builder(1);
        pose.set(0, body.origin(), body.labFromBody());
        Vector3 arm = body.labFromBody().times(mass.centre());
        return new MovingSegment(
                mass,
                pose.build(),
                one(body.omega()),
                one(body.alpha()),
                one(body.origin().plus(arm)),
                one(body.accelerationAt(arm)));
    }

    private static List<VectorSeries> jointsFromTheFootUp(JsonNode values, String variant) {
        List<VectorSeries> joints = new ArrayList<>();
        for (int k = FOOT; k >= 0; k--) {
            joints.add(one(vector(values.get(variant).get("joint").get(k).get("centre_world"))));
        }
        return joints;
    }

    private static WrenchSeries ground(JsonNode values) {
        JsonNode ground = values.get("ext");
        return new WrenchSeries(vector(ground.get("cop")), one(vector(ground.get("F"))), one(vector(ground.get("T"))));
    }

    private static VectorSeries one(Vector3 value) {
        return VectorSeries.constant(value, 1);
    }

    private static Vector3 vector(JsonNode node) {
        return new Vector3(
                node.get(0).asDouble(), node.get(1).asDouble(), node.get(2).asDouble());
    }

    private static Rotation rotation(JsonNode rows) {
        return Rotation.ofColumns(vector(rows.get(0)), vector(rows.get(1)), vector(rows.get(2)))
                .transpose();
    }
}
