package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import com.networknt.schema.Error;
import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** Holds JSON against a schema of the command line. */
final class SchemaCheck {
  private SchemaCheck() {}

  static List<Error> faults(String schemaName, String json) throws IOException {
    try (InputStream in = Main.class.getResourceAsStream(schemaName + ".schema.json")) {
      String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
      Schema schema =
          SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
              .getSchema(text, InputFormat.JSON);
      return schema.validate(json, InputFormat.JSON);
    }
  }

  static void assertValid(String schemaName, String json) throws IOException {
    assertThat(faults(schemaName, json)).isEmpty();
  }
}
