package org.evendraft.platform;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import org.evendraft.geometry.Mesh;
import org.evendraft.geometry.Vec3;

/** Writes meshes as bodies of a document. */
public final class MeshBodies {
    private MeshBodies() {}

    /**
     * The body of shape {@code mesh} that a mesh makes.
     *
     * @param mesh its surface
     * @param name the body's name
     */
    public static ObjectNode toJson(Mesh mesh, String name) {
        ObjectNode body = Json.mapper().createObjectNode().put("name", name).put("shape", "mesh");
        ArrayNode vertices = body.putArray("vertices");
        for (int i = 0; i < mesh.vertexCount(); i++) {
            Vec3 v = mesh.vertex(i);
            vertices.addArray().add(v.x()).add(v.y()).add(v.z());
        }
        ArrayNode triangles = body.putArray("triangles");
        for (int i = 0; i < mesh.triangleCount(); i++) {
            triangles.addArray().add(mesh.corner(i, 0)).add(mesh.corner(i, 1)).add(mesh.corner(i, 2));
        }
        return body;
    }
}
